/** What a step would write: its formulas and their headings, in places counted from the cell they are put at. */
import { standardRowHeadings } from '../../functions/results';
import type { Answered, Estimate } from '../calls/estimate';
import { standardRowFormats, turned, type NumberFormats } from '../numberFormats';
import type { CellToWrite, SheetArea } from '../port';
import { areaOf, headingOf, type Run, type Table } from '../runs';

export interface Size {
  readonly rows: number;
  readonly columns: number;
}

export interface Part extends Omit<CellToWrite, 'area' | 'numberFormats'> {
  readonly down: number;
  readonly right: number;
  /** Worked out when it is put in, since it takes the answer. */
  readonly formats?: () => NumberFormats;
}

/** The readings over their times, and the answer as a line where it is one through them. */
export interface ChartOfRun {
  readonly axes: { readonly x: string; readonly y: string };
  readonly x: SheetArea;
  readonly y: SheetArea;
  readonly isFit: boolean;
}

export interface Insertion {
  /** For headings and the undo button: `rate at 30 s`. */
  readonly name: string;
  readonly parts: readonly Part[];
  /** Of all that stands below the headings. */
  readonly size: Size;
  /** Written when asked for, above each column or left of each row; none where the answer brings its own. */
  readonly headings: readonly string[];
  readonly headingsStand?: 'above' | 'left';
  /** The cells that it reads, which it must not cover. */
  readonly reads: readonly SheetArea[];
  /** What a chart beside it would show. */
  readonly chart?: ChartOfRun;
  /** Whether uncertainty and limits can stand beside the value. */
  readonly hasDetail: boolean;
  /** Whether it has a cell a reading, and stands beside them. */
  readonly isAlongRun?: boolean;
  /** The run it begins beside, where that is not the chosen one. */
  readonly beside?: Run;
  /** Whether a blank column must keep it apart from the table, which it would else seem to belong to. */
  readonly isApart?: boolean;
  /** Whether it goes to the active cell, rather than beside the run. */
  readonly isAtActiveCell?: boolean;
  /** Whether the run goes on with the column it puts in. */
  readonly becomesReadings?: boolean;
}

/** One formula, as large as its answer. */
export function oneFormula(
  formula: string,
  size: Size,
  formats?: () => NumberFormats,
): Pick<Insertion, 'parts' | 'size'> {
  const spills = size.rows * size.columns > 1 ? { spills: size } : {};
  return { parts: [{ down: 0, right: 0, content: { formula }, formats, ...spills }], size };
}

/** Of the first columns of the standard row, as many as are put in; nothing where there is no answer. */
export function estimateFormats(answer: Answered<Estimate>, columns: number): NumberFormats {
  return 'ok' in answer ? [standardRowFormats(answer.ok).slice(0, columns)] : [];
}

export const chartOf = (table: Table, run: Run, isFit: boolean): ChartOfRun => ({
  axes: { x: headingOf(table, run.timeColumn).text, y: headingOf(table, run.readingColumn).text },
  x: areaOf(table, run.timeColumn, run),
  y: areaOf(table, run.readingColumn, run),
  isFit,
});

/** What has a cell a reading lies as the run does: in a row beside a row, its headings left of it. */
export function alongRun({ isTurned }: Table, insertion: Insertion): Insertion {
  if (!isTurned) return { ...insertion, isAlongRun: true };
  return {
    ...insertion,
    parts: insertion.parts.map(({ down, right, spills, formats, ...rest }) => ({
      ...rest,
      down: right,
      right: down,
      ...(spills && { spills: turnedSize(spills) }),
      ...(formats && { formats: () => turned(formats()) }),
    })),
    size: turnedSize(insertion.size),
    headingsStand: 'left',
    isAlongRun: true,
  };
}

const turnedSize = ({ rows, columns }: Size): Size => ({ rows: columns, columns: rows });

/** `/ mL`, `/ (mL/s)`; words stand in brackets of their own. */
function inUnit(unit: string): string {
  if (unit === '' || unit === '1') return '';
  if (/\bunit\b/.test(unit)) return ` (${unit})`;
  return ` / ${/[/ ]/.test(unit) ? `(${unit})` : unit}`;
}

/** `rate at 30 s / (mL/s)`, and with detail the rest of the standard row. */
export function headingsFor(name: string, unit: string, withDetail: boolean): string[] {
  const [, ...others] = standardRowHeadings;
  const rest = others.map((other) => (other === 'degrees of freedom' ? other : `${other}${inUnit(unit)}`));
  return [`${name}${inUnit(unit)}`, ...(withDetail ? rest : [])];
}

export const detailColumns = (withDetail: boolean): number => (withDetail ? standardRowHeadings.length : 1);
