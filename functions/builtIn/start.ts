/** The initial rate of a run, said in built-in functions. */
import { standardRowTexts } from './estimate';
import type { Given } from './given';
import { holdsOf } from './phrase';
import { SortedRun } from './sortedRun';
import { oneValue, type Said } from './said';
import { where } from './text';
import type { Table, WorkingCell } from './workings';

/** A parabola, and two readings to judge its scatter by. */
const fewest = 5;

/** Rows of the table. */
const [late, limit, third, early, used, slope, uncertainty] = [0, 1, 2, 3, 4, 5, 6];

export function sayStart(given: Given): Said {
  const run = new SortedRun(given);
  const nu = run.stoichiometricNumber(given);
  const [share, detail] = [given.number('share'), given.flag('detail')];
  const far = given.numberFromWorkings('share');
  const table = given.workings.table(`Initial rate, share ${far}: ${run.name}`, (own) => rows(run, own, far));
  const of = (row: number): string => table.cell(row, 0);
  const cells = standardRowTexts({
    value: `${of(slope)}/${nu.text}`,
    uncertainty: `${of(uncertainty)}/ABS(${nu.text})`,
    degreesOfFreedom: `(${of(used)}-3)`,
  });
  const holds = [...run.holds, ...holdsOf(share, nu), ...detail.holds, `${run.different}>1`];
  const say = (column: number): string => where(holds, `IF(ISNUMBER(${of(third)}),${cells[column]},NA())`);
  return detail.value ? { cell: (_, column) => say(column) } : oneValue(say(0));
}

/** How many readings are early, and the parabola through them. */
function rows(run: SortedRun, own: Table, share: string): WorkingCell[][] {
  const { times, values, numbers, count, size } = run;
  const [first, start] = [run.time(0), run.value(0)];
  const of = (row: number): string => own.cell(row, 0);
  const later = (than: string): string => `MIN(IF(ISNUMBER(${times}),IF(${times}>${than},${times},""),""))`;
  const beyond = `IF(ISNUMBER(${values}),IF(ABS(${values}-${start})>${of(limit)},${numbers},${size + 1}),${size + 1})`;
  // replicates belong together, and a parabola needs three different times
  const until = `MAX(INDEX(${times},${of(early)}),${of(third)})`;
  const window = (range: string): string => `INDEX(${range},1):INDEX(${range},${of(used)})`;
  const fit = `LINEST(${window(values)},(${window(times)}-${first})^{1,2},TRUE,TRUE)`;
  const list: WorkingCell[][] = [];
  list[late] = [
    {
      formula: `AVERAGE(INDEX(${values},${count}+1-MAX(1,MIN(3,INT(${count}/5)))):INDEX(${values},${count}))`,
    },
    'mean of the last readings',
  ];
  list[limit] = [{ formula: `${share}*ABS(${of(late)}-${start})` }, 'change up to which readings are early'];
  list[third] = [
    { formula: `IF(MAX(${times})>${later(first)},${later(later(first))},"")` },
    'third of the different times',
  ];
  list[early] = [
    { formula: `MIN(${count},MAX(${fewest},MIN(${beyond})-1))` },
    `early readings, ${fewest} at least`,
  ];
  list[used] = [
    { formula: `SUM(IF(ISNUMBER(${times}),IF(${times}<=${until},1,0),0))` },
    'readings used: those of one time together',
  ];
  list[slope] = [{ formula: `INDEX(${fit},1,2)` }, 'slope of their parabola at the first time'];
  list[uncertainty] = [{ formula: `INDEX(${fit},2,2)` }, 'its standard uncertainty'];
  return list;
}
