/** What TANGENT and ALONG have in common. */
import { highestDegree } from '../../src/rate/localPolynomial';
import { stoichiometricNumber } from '../commonParameters';
import { number, optional } from '../parameters';

export const tangentParameters = {
  points: optional(
    number({ help: 'readings the tangent rests on, more than the degree', atLeast: 2, whole: true }),
    undefined,
    'the number with the smallest expected error',
  ),
  degree: optional(
    number({ help: 'degree of the polynomial', atLeast: 1, atMost: highestDegree, whole: true }),
    2,
  ),
  coefficient: stoichiometricNumber(),
};

/** Of the method, which both state. */
export const tangentMethod =
  'r = (1/ν) dy/dt by unweighted least squares of a polynomial through the nearest readings, on one side at the ends; a tie goes to the earlier reading. Left out, the number of readings is the one for which the expected squared error of the slopes, bend and scatter together, is smallest over the run. With the number given, the standard uncertainty comes from the scatter about the polynomial, with points − degree − 1 degrees of freedom, and knows nothing of a bend the polynomial cannot follow; with the number left out, uncertainty and limits are those of one degree more in the same readings, which are nearly free of that bias, from the scatter pooled over the run.';
