import { findings } from '../../src/series/check/findings';
import { nothingFound } from '../../src/series/check/nothingFound';
import { defineFunction } from '../define';
import { placesInWords } from './places';
import { rawColumn } from './rawColumn';

const headings = ['finding', 'where', 'what it means', 'what to do'] as const;

export default defineFunction({
  name: 'CHECK',
  family: 'care',
  summary: 'What in a run could spoil a rate, an order or a half life, in words, with what to do about it.',
  method:
    'Looks for error cells, numbers kept as text, readings beyond a limit, gaps, midnight between clock times, times out of order, replicates, zeros to which the readings beside them do not lead, outliers (each reading against a quadratic through its eight nearest neighbours, scatter from the median of such distances, limit by Student’s t for a chance of 1 % in a clean run and never below 4.5 standard deviations), steps, a course that turns round, drift or a plateau at the end, an induction period, how many half lives were followed (a falling column is taken to end at 0 unless it is seen to level off elsewhere), coarse readings, holes between readings, and methods that need more readings. One cause gives one finding, and what spoils a result first stands first. Places are counted from the start of the range, in columns where a run stands in a row. Headings may be part of the range.',
  uncertainty:
    'None is given: it points at places. What it is sure of and what it only suspects stands in its words.',
  parameters: {
    times: rawColumn({ help: 'times of the run', unit: 'time' }),
    values: rawColumn({ help: 'readings, amounts or concentrations, one a time' }),
  },
  result: { unit: 'words', shape: 'table' },
  // halved every 10, the third typed with a decimal comma where the sheet has a point
  example: {
    formula: '=PACE.CHECK({0;10;20;30;40;50;60},{64;32;"16,0";8;4;2;1})',
    equals: [
      ['finding', 'where'],
      ['one pair holds a number stored as text: "16,0"', 'row 3'],
    ],
  },
  refusals: [{ formula: '=PACE.CHECK({0;10;20},{8;4})', mend: 'Choose both columns with the same rows.' }],
  seeAlso: ['ORDERS', 'TANGENT', 'SURVEY'],
  reference: 'doi:10.1080/01621459.1974.10482962; doi:10.1093/biomet/76.2.297',
  isLong: { fromCells: 2000 },
  run({ times, values }) {
    const run = { times: times.cells, values: values.cells };
    const found = findings(run);
    if (found.length === 0) return [[nothingFound(run)]];
    return [
      [...headings],
      ...found.map(({ finding, places, meaning, advice }) => [
        finding,
        placesInWords(places, times),
        meaning,
        advice,
      ]),
    ];
  },
});
