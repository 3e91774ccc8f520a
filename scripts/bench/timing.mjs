/** The middle value: of an even count, the mean of the two in the middle. */
export function median(values) {
  const sorted = [...values].sort((a, b) => a - b);
  const middle = sorted.length >> 1;
  return sorted.length % 2 ? sorted[middle] : (sorted[middle - 1] + sorted[middle]) / 2;
}

/**
 * Times rival answers to the same questions, turn by turn, so that whatever else the machine does falls on all alike.
 * Returns the median milliseconds a question by rival, after one round that is not counted.
 */
export async function timeRivals(rivals, questions, rounds) {
  const taken = Object.fromEntries(Object.keys(rivals).map((name) => [name, []]));
  for (let round = 0; round <= rounds; round += 1)
    for (const question of questions)
      for (const [name, answer] of Object.entries(rivals)) {
        const begun = performance.now();
        const answered = answer(question);
        if (answered instanceof Promise) await answered;
        if (round > 0) taken[name].push(performance.now() - begun);
      }
  return Object.fromEntries(Object.entries(taken).map(([name, values]) => [name, median(values)]));
}
