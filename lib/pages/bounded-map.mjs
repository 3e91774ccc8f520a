/** A map that forgets what was used longest ago, once it holds too many entries or too much weight. */
export class BoundedMap {
  #entries = new Map();
  #weight = 0;

  /**
   * @param {number} most entries kept
   * @param {number} [heaviest] weight kept, in the unit of `weigh`
   * @param {(value: any) => number} [weigh]
   */
  constructor(most, heaviest = Infinity, weigh = () => 0) {
    this.most = most;
    this.heaviest = heaviest;
    this.weigh = weigh;
  }

  get size() {
    return this.#entries.size;
  }

  /** @param {string} key */
  get(key) {
    const held = this.#entries.get(key);
    if (!held) return undefined;
    this.#entries.delete(key);
    this.#entries.set(key, held);
    return held.value;
  }

  /** @param {string} key @param {any} value */
  set(key, value) {
    this.delete(key);
    const weight = this.weigh(value);
    this.#entries.set(key, { value, weight });
    this.#weight += weight;
    for (const oldest of this.#entries.keys()) {
      if (this.#entries.size <= this.most && this.#weight <= this.heaviest) break;
      this.delete(oldest);
    }
  }

  /** @param {string} key */
  delete(key) {
    this.#weight -= this.#entries.get(key)?.weight ?? 0;
    this.#entries.delete(key);
  }
}
