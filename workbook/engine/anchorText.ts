/** `F2#`, the whole spill that starts in F2, as a person types it; files and the engine write ANCHORARRAY(F2). */
export const anchorArray = 'ANCHORARRAY';

/** Words in quotes, sheet names in quotes, or the cell (or name) before a `#`. */
const anchored = /"(?:[^"]|"")*"|((?:(?:'(?:[^']|'')+'|[\w.]+)!)?\$?[A-Z_\\][\w.$\\]*)#|'(?:[^']|'')*'/gi;

/** `=SUM(F2#)` → `=SUM(ANCHORARRAY(F2))`. */
export const withoutHash = (formula: string): string =>
  formula.includes('#')
    ? formula.replace(anchored, (all, cell?: string) =>
        cell === undefined ? all : `${anchorArray}(${cell})`,
      )
    : formula;

const anchorCall = /"(?:[^"]|"")*"|\bANCHORARRAY\(((?:'(?:[^']|'')+'|[^'()",])+)\)/gi;

/** `=SUM(ANCHORARRAY(F2))` → `=SUM(F2#)`. */
export const withHash = (formula: string): string =>
  formula.replace(anchorCall, (all, cell?: string) => (cell === undefined ? all : `${cell}#`));
