const longest = 4;

/** `A1, A2, A3, A4 and 12 more`. */
export const list = (names: readonly string[]): string =>
  names.length <= longest
    ? names.join(', ')
    : `${names.slice(0, longest).join(', ')} and ${names.length - longest} more`;
