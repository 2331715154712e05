/**
 * Tangents in a window that the data chose, with limits free of its bias (src/rate/tangent.ts, with its source): they
 * are those of one degree more, from the scatter pooled over the run.
 */
import type { Given } from './given';
import { TangentScatter } from './tangentScatter';
import type { Windows } from './windows';
import type { Table, WorkingCell } from './workings';

export class PooledTangents {
  private readonly scatter: TangentScatter;

  constructor(
    private readonly given: Given,
    private readonly windows: Windows,
    private readonly degree: number,
    private readonly nu: string,
  ) {
    this.scatter = new TangentScatter(given, windows, degree + 1);
  }

  /** That one degree more can be told. */
  get fits(): string[] {
    const { run, points } = this.windows;
    return [`MIN(${run.different},${points})>${this.degree + 1}`];
  }

  /** The standard row at the time that was given, as the sheet "Workings" names it. */
  rowAt(time: string): string[] {
    const table = this.table(`Tangent at ${time}`, () => [this.line(time)]);
    return this.row([0, 1, 2].map((column) => table.cell(1, column)));
  }

  /** The standard row at the time of a reading. */
  rowAlong(time: string): string[] {
    const { run } = this.windows;
    const table = this.table('Tangents at each reading', () =>
      Array.from({ length: run.size }, (_, n) =>
        this.line(run.time(n), this.scatter.begins(n)).map(
          (formula) => `IF(ISNUMBER(${run.time(n)}),${formula},"")`,
        ),
      ),
    );
    const place = `MATCH(${time},${run.times},0)`;
    return this.row([0, 1, 2].map((column) => `INDEX(${table.range(1, column, run.size)},${place})`));
  }

  private table(title: string, lines: () => readonly (readonly string[])[]): Table {
    const { given, windows, degree } = this;
    return given.workings.table(`${title}, degree ${degree}, ${windows.name}`, (): WorkingCell[][] => [
      [`slope, degree ${degree}`, `slope, degree ${degree + 1}`, 'its variance factor'].map((heading) => ({
        heading,
      })),
      ...lines().map((line) => line.map((formula) => ({ formula }))),
    ]);
  }

  private line(time: string, first?: string): string[] {
    const [own, finer] = [0, 1].map((more) => this.windows.polynomial(time, this.degree + more, first));
    return [own.slope, finer.slope, finer.slopeVariance];
  }

  /** The limits are widened to hold the rate itself where they do not. */
  private row([slope, finer, spread]: readonly string[]): string[] {
    const { scatter, nu } = this;
    const value = `${slope}/${nu}`;
    const uncertainty = `SQRT(${scatter.variance}*${spread})/ABS(${nu})`;
    const reach = `${scatter.studentFactor}*${uncertainty}`;
    return [
      value,
      uncertainty,
      `MIN(${value},${finer}/${nu}-${reach})`,
      `MAX(${value},${finer}/${nu}+${reach})`,
      scatter.degreesOfFreedom,
    ];
  }
}
