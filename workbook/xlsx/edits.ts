/** Changes to a text by place: everything between them stays as it is. */
import type { Span } from './sheetScan';

export interface Edit extends Span {
  readonly text: string;
}

/** Edits must not overlap; those at one place follow each other in the order given. */
export function applyEdits(text: string, edits: readonly Edit[]): string {
  const pieces: string[] = [];
  let at = 0;
  for (const edit of [...edits].sort((a, b) => a.start - b.start)) {
    pieces.push(text.slice(at, edit.start), edit.text);
    at = edit.end;
  }
  pieces.push(text.slice(at));
  return pieces.join('');
}

export const insertion = (at: number, text: string): Edit => ({ start: at, end: at, text });
