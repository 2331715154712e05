/** The version of a manifest: Excel, and an administrator's catalogue, take note of one only when it is higher. */

const hour = 3_600_000; // ms
const beginning = Date.UTC(2026, 0, 1);

/** The version of the package, then the whole hours since 2026 began, which fit five digits until 2037. */
export const versionAt = (ofPackage: string, time: Date): string =>
  `${ofPackage}.${Math.floor((time.getTime() - beginning) / hour)}`;

/** Four parts, each of five digits at most (manifest reference, Version element). @throws with the rule in words */
export function requireVersion(text: string): string {
  if (/^\d{1,5}(\.\d{1,5}){3}$/.test(text)) return text;
  throw new Error(`the version must be four numbers of five digits at most, such as 1.2.3.4: got "${text}"`);
}
