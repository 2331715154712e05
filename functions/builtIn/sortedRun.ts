/** A run on the sheet "Workings": in the order of its times and without gaps, whatever its columns hold. */
import type { Given } from './given';
import { Pairs } from './pairs';
import type { Phrase } from './phrase';
import type { Table, WorkingCell } from './workings';

/** Of the table: below how many there are, which way they go, and the headings. */
const firstRow = 3;

export class SortedRun {
  /** The columns where they stand, to say of what must hold of them. */
  readonly pairs: Pairs;
  /** For titles of what rests on it. */
  readonly name: string;
  /** Readings that there is room for. */
  readonly size: number;
  private readonly table: Table;

  constructor(
    private readonly given: Given,
    x = 'times',
    y = 'values',
  ) {
    this.pairs = Pairs.of(given, x, y);
    this.size = this.pairs.size;
    const pairs = Pairs.of(given.fromWorkings(), x, y);
    this.name = `${pairs.y} over ${pairs.x}`;
    this.table = given.workings.table(`Run: ${this.name}, in the order of time, without gaps`, (own) => [
      [{ formula: pairs.count }, 'readings'],
      [{ formula: pairs.trend() }, '1 where they rise, -1 where they fall'],
      [{ heading: 'time' }, { heading: 'reading' }, { heading: 'number' }],
      ...sorted(pairs, own),
    ]);
  }

  get count(): string {
    return this.table.cell(0, 0);
  }

  /** The times in order, with empty text below the last. */
  get times(): string {
    return this.table.range(firstRow, 0, this.size);
  }

  get values(): string {
    return this.table.range(firstRow, 1, this.size);
  }

  /** 1, 2, 3 … beside them. */
  get numbers(): string {
    return this.table.range(firstRow, 2, this.size);
  }

  time = (n: number): string => this.table.cell(firstRow + n, 0);
  value = (n: number): string => this.table.cell(firstRow + n, 1);

  /** 1 where the run rises or is level, −1 where it falls. */
  get direction(): string {
    return this.table.cell(1, 0);
  }

  /** As given, or by the trend. */
  get stoichiometricNumber(): Phrase {
    if (this.given.has('coefficient')) return this.pairs.stoichiometricNumber(this.given);
    return { text: this.direction, holds: [] };
  }
}

function sorted(pairs: Pairs, own: Table): WorkingCell[][] {
  return Array.from({ length: pairs.size }, (_, n): WorkingCell[] => {
    const [first, time] = [own.cell(firstRow, 0), own.cell(firstRow + n, 0)];
    const beyond = (text: string): string => `IF(${own.cell(0, 0)}<${n + 1},"",${text})`;
    // equal times stay in their order
    const among = n === 0 ? '1' : `${n + 2}-MATCH(${time},${first}:${time},0)`;
    const places = pairs.some(`IF(${pairs.x}=${time},${pairs.places},"")`);
    return [
      { formula: beyond(`SMALL(${pairs.some(pairs.x)},${n + 1})`) },
      { formula: beyond(`INDEX(${pairs.y},SMALL(${places},${among}))`) },
      n + 1,
    ];
  });
}
