/** Random numbers that come out the same on every run and machine (mulberry32), from 0 up to but without 1. */
export function randomFrom(start) {
  let state = start >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296;
  };
}

export const pick = (random, list) => list[Math.floor(random() * list.length)];

/** Draws from a list whose nth item is n times rarer than its first, as words are in text (Zipf). */
export function zipfOver(random, list) {
  const sums = [];
  let sum = 0;
  for (let rank = 1; rank <= list.length; rank += 1) sums.push((sum += 1 / (rank + 2)));
  return () => {
    const drawn = random() * sum;
    let low = 0;
    for (let high = sums.length - 1; low < high;) {
      const middle = (low + high) >> 1;
      if (sums[middle] < drawn) low = middle + 1;
      else high = middle;
    }
    return list[low];
  };
}
