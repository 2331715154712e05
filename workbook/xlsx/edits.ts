/** Changes to a text by place: everything between them stays as it is. */
import type { Span } from './sheetScan';

export interface Edit extends Span {
  readonly text: string;
}

/**
 * Those at one place follow each other in the order given, insertions before what is replaced there: a new cell
 * may stand right before a changed one.
 *
 * @throws where two edits overlap, since one of them would be lost
 */
export function applyEdits(text: string, edits: readonly Edit[]): string {
  const pieces: string[] = [];
  let at = 0;
  for (const edit of [...edits].sort((a, b) => a.start - b.start || a.end - b.end)) {
    if (edit.start < at) throw new Error(`two changes overlap at character ${edit.start}`);
    pieces.push(text.slice(at, edit.start), edit.text);
    at = edit.end;
  }
  pieces.push(text.slice(at));
  return pieces.join('');
}

export const insertion = (at: number, text: string): Edit => ({ start: at, end: at, text });
