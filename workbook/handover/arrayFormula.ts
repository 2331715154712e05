/** Counting over a range needs no array; one of our guards in every cell of a column is just that. */
const counting = /\bCOUNTIF\((?:'(?:[^']|'')+'!|[A-Za-z_][\w.]*!)?\$?[A-Z]+\$?\d+(?::\$?[A-Z]+\$?\d+)?,/g;

const texts = /"(?:[^"]|"")*"/g;

/**
 * Whether a formula must stand in its cell as an array: wherever an operator is given a range. Programs of
 * old and of today agree on that form alone.
 */
export const isArrayFormula = (formula: string): boolean =>
  /[:{]/.test(formula.replace(texts, '""').replace(counting, 'COUNTIF('));
