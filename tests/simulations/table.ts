/** A table in Markdown. */
export function table(headings: readonly string[], rows: readonly (readonly (string | number)[])[]): string {
  const line = (cells: readonly (string | number)[]): string => `| ${cells.join(' | ')} |`;
  return [line(headings), line(headings.map(() => '---')), ...rows.map(line)].join('\n');
}

export const percent = (share: number): string => `${(100 * share).toFixed(1)} %`;
