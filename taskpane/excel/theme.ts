/** @returns nothing where this Office has no themes to speak of, as on the web */
export function officeIsDark(): boolean | undefined {
  const theme = Office.context.officeTheme as Partial<Office.OfficeTheme> | undefined;
  if (!theme) return undefined;
  if (typeof theme.isDarkTheme === 'boolean') return theme.isDarkTheme;
  return isDark(theme.bodyBackgroundColor);
}

/** Before Office said so in one word it gave its colours: `#252525`. */
function isDark(colour: string | undefined): boolean | undefined {
  const parts = /^#(..)(..)(..)$/
    .exec(colour ?? '')
    ?.slice(1)
    .map((part) => parseInt(part, 16));
  if (!parts) return undefined;
  const [red, green, blue] = parts;
  return 0.299 * red + 0.587 * green + 0.114 * blue < 128; // luma of ITU-R BT.601
}
