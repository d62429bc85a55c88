/** The element at an index that is known to exist; a wrong index throws instead of spreading NaN. */
export function nth<T>(list: readonly T[], index: number): T {
  const element = list[index];
  if (element === undefined) throw new RangeError(`No element ${index} of ${list.length}.`);
  return element;
}
