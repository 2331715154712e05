import { InvalidInput } from '../../src/errors';
import { coefficientEstimate } from '../../src/scheme/coefficientLimits';
import type { Tell } from '../../src/progress';
import { followed, type Signal } from '../../src/scheme/experiment';
import { fitMechanism, type MechanismFit } from '../../src/scheme/fitMechanism';
import { reactionInWords, type Scheme } from '../../src/scheme/scheme';
import { columnsBeside } from '../block';
import { block } from '../parameters';
import { CellError, type CellValue } from '../cell';
import type { Column } from '../column';
import { detail } from '../commonParameters';
import { tableOfCourse, type FittedCourse } from '../builtIn/fittedCourse';
import { defineFunction, type Values } from '../define';
import { uncertaintyOf } from '../uncertaintyOf';
import { standardRow, standardRowHeadings } from '../results';
import {
  courseAt,
  filled,
  schemeEquations,
  schemeMethod,
  schemeParameters,
  speciesAt,
  stepAt,
  timesOf,
} from './schemeParameters';

/** Beyond this correlation two coefficients are hard to tell apart, which the answer says. */
const closeCorrelation = 0.95;

const parameters = {
  ...schemeParameters,
  observed: block({
    help: 'readings, a column a species in order of first appearance; blank where one was not observed',
    unit: 'as initial',
  }),
};

export default defineFunction({
  name: 'FITCOURSE',
  family: 'mechanism',
  summary: 'Rate coefficients of a written mechanism, fitted to the readings of several species at once.',
  equations: schemeEquations,
  method: `${schemeMethod} The coefficients given are where the search starts. Least squares over all readings as they are, each counting alike, so all columns must be in one unit; coefficients are searched as logarithms, with sensitivities integrated beside the concentrations; where start values lead to a poorer fit than coefficients that suit the length of the run, the better is taken. Limits are those of the profile likelihood. A coefficient that the readings cannot tell, or whose standard uncertainty exceeds itself, is #N/A and says why. With detail: a row a coefficient, and after the standard row the one it is hard to tell from.`,
  uncertainty: uncertaintyOf.profile,
  parameters: { ...parameters, detail: detail() },
  result: { unit: 'concentration^(1−n) per time', shape: 'table' },
  // A halves every 10, B is not observed
  example: {
    formula: '=PACE.FITCOURSE("A -> B",{0.1},{8;0},{0;10;20;30},{8,;4,;2,;1,})',
    equals: [[0.06931471805599453]],
    within: 1e-8,
  },
  refusals: [
    {
      formula: '=PACE.FITCOURSE("A -> B",0.1,{8;0},{0;10;20},{8;4;2})',
      mend: 'Give a column for each species, blank where it was not observed.',
    },
    {
      formula: '=PACE.FITCOURSE("A -> B",0,{8;0},{0;10;20},{8,;4,;2,})',
      mend: 'Start from any value above 0 that suits the length of the run.',
    },
    {
      formula: '=PACE.FITCOURSE("A -> B; B -> C",{0.1;0.1},{8;0;0},{10},{4,,})',
      mend: 'Take more readings than there are coefficients.',
    },
  ],
  seeAlso: ['COURSE', 'ORDERS', 'PLAN'],
  reference: 'doi:10.1007/s10543-023-00967-x; Bates and Watts, Nonlinear Regression Analysis (1988), 6.1',
  isLong: true,
  run({ detail: isDetailed, ...given }, tell) {
    const { coefficients, ...fit } = fitted(given, tell);
    if (isDetailed)
      return coefficients.map((_, place) => {
        tell?.({ doing: `limits of coefficient ${place + 1} of ${coefficients.length}` });
        return detailedRow(given.scheme, { ...fit, coefficients }, place);
      });
    return [coefficients.map(({ value, why }) => (why === '' ? value : new CellError('#N/A', why)))];
  },
  fits: (given) => tableOfCourse(fittedCourse, given),
});

type Given = Values<typeof parameters>;

function fitted({ scheme, coefficients, initial, times, observed }: Given, tell?: Tell): MechanismFit {
  const start = filled(coefficients, 'coefficients', stepAt(scheme));
  const experiment = {
    initial: filled(initial, 'initial', speciesAt(scheme)),
    times: timesOf(times),
    signals: signalsOf(scheme, times, observed),
  };
  return fitMechanism({ scheme, start, experiments: [experiment], tell });
}

function fittedCourse(given: Given): FittedCourse {
  const { scheme, times, observed } = given;
  const { coefficients } = fitted(given);
  const values = coefficients.map(({ value }) => value);
  const start = filled(given.initial, 'initial', speciesAt(scheme));
  return {
    ...given,
    coefficients: coefficients.map(({ value, why }) => (why === '' ? value : null)),
    observed: columnsOf(scheme, times, observed),
    course: courseAt(scheme, values, start, times),
  };
}

/** One a species that was observed at all. */
const signalsOf = (scheme: Scheme, times: Column, readings: Column): Signal[] =>
  columnsOf(scheme, times, readings)
    .map(({ numbers }, j) =>
      followed(
        scheme,
        scheme.species[j],
        numbers.filter((_, i) => times.numbers[i] !== null),
      ),
    )
    .filter((signal) => signal.readings.some((reading) => reading !== null));

/** One a species. @throws InvalidInput where the block does not fit times and scheme */
function columnsOf({ species }: Scheme, times: Column, readings: Column): Column[] {
  const columns = columnsBeside(readings, times, { block: 'observed', beside: 'times' });
  if (columns.length === species.length) return columns;
  throw new InvalidInput(
    `observed must have a column for each of ${species.length} species (${species.join(', ')}): got ${columns.length}`,
  );
}

function detailedRow(scheme: Scheme, fit: MechanismFit, place: number): CellValue[] {
  const { why } = fit.coefficients[place];
  if (why !== '') return [...standardRowHeadings.map(() => new CellError('#N/A', why)), ''];
  return [...standardRow(coefficientEstimate(fit, place)), correlationInWords(scheme, fit, place)];
}

function correlationInWords(scheme: Scheme, { correlations }: MechanismFit, place: number): string {
  const own = correlations[place];
  const close = own.flatMap((r, other) =>
    other !== place && Math.abs(r) > closeCorrelation
      ? [`${reactionInWords(scheme, other)}, r = ${r.toFixed(3)}`]
      : [],
  );
  return close.length > 0 ? `moves with ${close.join('; ')}` : '';
}
