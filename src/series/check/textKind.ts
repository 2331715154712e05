/** What a text cell was meant to be. */

const number = String.raw`[+\-−]?(\d[\d   ]*([.,]\d*)?|[.,]\d+)([eE][+\-−]?\d+)?`;
const plainNumber = new RegExp(`^'?${number}$`);
const numberWithUnit = new RegExp(String.raw`^'?${number}[   ]*[a-zA-Zµμ°%Å/][^0-9]{0,15}$`);
const clock = /^\d{1,3}:\d{2}(:\d{2}([.,]\d+)?)?$/;
const limit = new RegExp(String.raw`^([<>≤≥]|<=|>=)\s*${number}`);
const belowLimit =
  /^(n\.?\s?d\.?|b\.?d\.?l\.?|<?\s?(lod|loq)|not detected|below detection|over(range|flow)?)$/i;

/** `"12,5"`, `"3.1 mL"`, `"0:04:30"`: a number for a person, text for a sheet. */
export function isNumberAsText(text: string): boolean {
  const trimmed = text.trim();
  return plainNumber.test(trimmed) || numberWithUnit.test(trimmed) || clock.test(trimmed);
}

/** `"<0.01"`, `"n.d."`: a reading known only to lie beyond a limit, which statistics calls censored. */
export function isCensored(text: string): boolean {
  const trimmed = text.trim();
  return limit.test(trimmed) || belowLimit.test(trimmed);
}
