/** The nearest number that is written within so many characters; the number itself where none is. */
export function fitting(value: number, characters: number): number {
  if (String(value).length <= characters) return value;
  for (let digits = 15; digits > 0; digits--) {
    const shorter = Number(value.toPrecision(digits));
    if (String(shorter).length <= characters) return shorter;
  }
  return value;
}
