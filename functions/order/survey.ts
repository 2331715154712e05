import { InvalidInput } from '../../src/errors';
import { surveyRun, type SurveyedRun } from '../../src/order/survey';
import { nthOf } from '../../src/progress';
import { pairReadings } from '../../src/series/series';
import { columnsBeside } from '../block';
import type { CellValue } from '../cell';
import type { Column } from '../column';
import { endpoint } from '../commonParameters';
import { tableOfLaws } from '../builtIn/law';
import { defineFunction, type Values } from '../define';
import { block, column, number, optional } from '../parameters';
import { orNotAvailable } from '../results';
import { watched, type WatchedLaws } from '../watchedLaw';
import { lawEquations, lawMethod } from './lawParameters';

const headings = [
  'run',
  'order',
  'rate coefficient',
  'standard uncertainty',
  'half life',
  'initial rate',
  'conversion reached',
  'flags',
] as const;

const parameters = {
  times: column({ help: 'times that all runs share', unit: 'time' }),
  block: block({ help: 'readings, one column a run' }),
  order: optional(number({ help: 'n of all runs' }), undefined, 'fitted for each run'),
  endpoint: endpoint(),
};

const lawsOfRuns: WatchedLaws<Values<typeof parameters>> = {
  what: 'Rate laws of several runs',
  readings: 'block',
  of: ({ times, block, order, endpoint }) =>
    columnsBeside(block, times, { block: 'block', beside: 'times' }).flatMap((run, line) => {
      if (run.numbers.every((value, i) => value === null || times.numbers[i] === null)) return [];
      const series = pairReadings(times.numbers, run.numbers);
      const { fit } = surveyRun(series, { order: order ?? 'free', endpoint });
      return fit ? [{ ...watched(fit, series, `run ${line + 1}`), line }] : [];
    }),
};

export default defineFunction({
  name: 'SURVEY',
  family: 'order',
  summary:
    'Many runs at a glance: order, rate coefficient, half life, initial rate and what needs a second look.',
  equations: lawEquations,
  method: `${lawMethod} One row a run below the headings. Conversion is that of the fitted law at the last reading. A run that cannot be fitted says why among its flags, and the others are not lost.`,
  uncertainty:
    'k has its standard uncertainty from the curvature of the fit and the scatter about it. For 95 % limits of one run: PACE.COEFFICIENT with detail TRUE.',
  parameters,
  result: { unit: 'as the headings say', shape: 'table' },
  example: {
    formula: '=PACE.SURVEY({0;10;20;30;40},{8,16;4,4;2,1;1,0.25;0.5,0.0625},1)',
    equals: [['run'], [1, 1, 0.06931471805599453], [2, 1, 0.13862943611198906]],
  },
  refusals: [
    {
      formula: '=PACE.SURVEY({0;10;20;30},{8,16;4,4;2,1},1)',
      mend: 'Choose as many rows of readings as there are times.',
    },
  ],
  seeAlso: ['COEFFICIENT', 'ORDERS', 'CHECK'],
  reference: 'doi:10.1351/goldbook.O04322',
  isLong: true,
  run({ times, block, order, endpoint }, tell) {
    const runs = columnsBeside(block, times, { block: 'block', beside: 'times' });
    const surveyed = runs.map((run, i) => {
      tell?.(nthOf('run', i, runs.length));
      return rowOf(times, run, i + 1, { order: order ?? 'free', endpoint });
    });
    return [[...headings], ...surveyed];
  },
  fits: (given) => tableOfLaws(lawsOfRuns, given).table,
});

type Law = { readonly order: number | 'free'; readonly endpoint: number | 'free' | undefined };

function rowOf(times: Column, run: Column, name: number, law: Law): CellValue[] {
  try {
    return cells(name, surveyRun(pairReadings(times.numbers, run.numbers), law));
  } catch (error) {
    if (!(error instanceof InvalidInput)) throw error;
    return cells(name, { fit: null, initialRate: null, flags: [error.message] });
  }
}

function cells(name: number, { fit, initialRate, flags }: SurveyedRun): CellValue[] {
  const why = flags[0] ?? '';
  return [
    name,
    orNotAvailable(fit?.order, why),
    orNotAvailable(fit?.rateCoefficient, why),
    orNotAvailable(
      fit?.standardUncertainties.rateCoefficient,
      why || 'as many parameters as readings leave no scatter to judge by',
    ),
    orNotAvailable(fit?.halfLife, why),
    orNotAvailable(initialRate, why),
    orNotAvailable(fit && 1 - fit.shareLeft, why),
    flags.join('; '),
  ];
}
