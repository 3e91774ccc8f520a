/**
 * True when `text` is a CAS Registry Number whose check digit is right: the digits before it, counted from the right,
 * each times its place, summed, modulo 10.
 * Source: CAS Registry, "Check digit verification of CAS Registry Numbers".
 */
export function isCas(text: string): boolean {
  const match = /^([1-9]\d{1,6})-(\d{2})-(\d)$/.exec(text);
  if (!match) return false;
  const digits = [...`${match[1]}${match[2]}`].reverse().map(Number);
  return digits.reduce((sum, digit, place) => sum + digit * (place + 1), 0) % 10 === Number(match[3]);
}
