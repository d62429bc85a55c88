/**
 * Whether a CAS number is well formed: its last digit is the sum of the others modulo 10, each
 * weighted by its place counted from the right (CAS Registry, check digit).
 */
export function isCasNumber(text: string): boolean {
  if (!/^[1-9]\d{1,6}-\d\d-\d$/.test(text)) return false;
  const digits = [...text.replaceAll('-', '')].map(Number);
  const check = digits.pop();
  return digits.reverse().reduce((sum, digit, i) => sum + digit * (i + 1), 0) % 10 === check;
}
