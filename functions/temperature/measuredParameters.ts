/** What the functions that fit rate coefficients over temperature have in common. */
import type { MeasuredCoefficients } from '../../src/temperature/measured';
import { InvalidInput } from '../../src/errors';
import { placeInWords, type Column } from '../column';
import { uncertainties } from '../commonParameters';
import type { Values } from '../define';
import { column, requireWithin } from '../parameters';
import { seriesOf, uncertaintiesOf } from '../run';
import { temperatures } from './temperatures';

export const measuredParameters = {
  temperatures: temperatures({ help: 'of the runs, one each' }),
  coefficients: column({ help: 'rate coefficients k, one a run, all in one unit' }),
};

/** The common parameter, in the words of coefficients. */
export const coefficientUncertainties = {
  ...uncertainties(),
  help: 'standard uncertainties of the coefficients, one each, or "relative" for the same share of each',
  unit: 'of coefficients',
  whenOmitted: 'the same share of each coefficient',
};

type Measured = Values<typeof measuredParameters> & {
  readonly uncertainties: Values<{ uncertainties: typeof coefficientUncertainties }>['uncertainties'];
};

/**
 * Pairs each coefficient with its temperature; a pair with a gap is skipped.
 *
 * @throws InvalidInput where lengths differ, no pair is left, or a coefficient or its uncertainty is not above 0
 */
export function measuredOf({ temperatures, coefficients, uncertainties }: Measured): MeasuredCoefficients {
  requireAsMany(coefficients, temperatures, 'coefficients');
  if (typeof uncertainties === 'object') requireAsMany(uncertainties, temperatures, 'uncertainties');
  requireSomePair(temperatures, coefficients);
  const series = seriesOf(temperatures, coefficients);
  series.values.forEach((value, i) =>
    requireWithin(value, { above: 0 }, 'coefficients', '1', placeInWords(series.places[i], coefficients)),
  );
  return {
    temperatures: series.times,
    coefficients: series.values,
    uncertainties: uncertaintiesOf(series, coefficients, uncertainties),
  };
}

export function requireAsMany({ numbers }: Column, temperatures: Column, name: string): void {
  if (numbers.length === temperatures.numbers.length) return;
  throw new InvalidInput(
    `${name} must be as many as temperatures: got ${numbers.length} for ${temperatures.numbers.length}`,
  );
}

function requireSomePair(temperatures: Column, coefficients: Column): void {
  if (temperatures.numbers.some((value, i) => value !== null && coefficients.numbers[i] !== null)) return;
  throw new InvalidInput(
    'temperatures and coefficients must hold numbers: no temperature and coefficient make a pair',
  );
}

/** Of the method, which all state. */
export const weightsInWords =
  'Least squares are of logarithms: each k counts with the same relative uncertainty, or with (k/u)² where uncertainties u are given; their scale comes from the scatter about the line. The choice matters: a nonlinear fit to k itself without uncertainties heeds the hottest runs alone, and on five published coefficients over 226 K moves the activation energy from 185 to 198 kJ/mol.';

export const arrheniusEquations = {
  lines: ['k = A exp(−E_a/(RT))', 'ln k = ln A − E_a/(RT)'],
  where: {
    k: 'rate coefficient',
    A: 'pre-exponential factor, in the unit of k',
    E_a: 'activation energy',
    R: 'molar gas constant, 8.314463 J/(mol K)',
    T: 'temperature, K',
  },
};
