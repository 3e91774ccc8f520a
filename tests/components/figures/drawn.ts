/** The numbers of a path, and the rows of the table below a figure: what a test reads a drawing by. */
export const numbersIn = (path: Element) =>
  [...path.getAttribute('d')!.matchAll(/-?\d+(?:\.\d+)?(?:e-?\d+)?/g)].map(([text]) => Number(text));

/** The points of a path of curves: every other pair of three is where it passes. */
export function pointsOf(path: Element): { x: number; y: number }[] {
  const numbers = numbersIn(path);
  return numbers.flatMap((x, i) => (i % 6 === 0 ? [{ x, y: numbers[i + 1]! }] : []));
}

export const tableOf = (container: Element) =>
  [...container.querySelectorAll('tbody tr')].map((row) =>
    [...row.querySelectorAll('td')].map((cell) => cell.textContent),
  );

export const wordsOf = (container: Element) => container.querySelector('desc')!.textContent;
