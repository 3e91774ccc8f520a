/** The most answers kept; one beyond it pushes out the oldest. */
export const MAX_KEPT = 400;

/**
 * Answers kept as text by question and library version, so that the same question gets the same bytes, and a strong ETag holds.
 * A publish changes the version and with it every key.
 */
export class AnswerCache {
  private readonly kept = new Map<string, string>();

  /** The kept answer under `key`, or the one `make` gives, kept from now on. */
  take(key: string, make: () => string): string {
    const held = this.kept.get(key);
    if (held !== undefined) return held;
    const made = make();
    this.kept.set(key, made);
    if (this.kept.size > MAX_KEPT) this.kept.delete(this.kept.keys().next().value!);
    return made;
  }
}
