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

/** Of the method, which both state; at the usual degree of 2. */
export const tangentEquations = {
  lines: ['yᵢ = b₀ + b₁(tᵢ − t) + b₂(tᵢ − t)² + eᵢ', 'r = b₁/ν'],
  where: {
    yᵢ: 'one of the nearest readings',
    tᵢ: 'its time',
    t: 'time at which the rate is wanted',
    'b₀': 'height of the curve there',
    'b₁': 'slope of the curve there: the tangent',
    'b₂': 'bend of the curve',
    eᵢ: 'scatter; the sum of its squares is made least',
    r: 'rate of reaction',
    ν: 'coefficient, the stoichiometric number of the species',
  },
};

export const tangentMethod =
  'A polynomial through the nearest readings by unweighted least squares, on one side at the ends; of two readings equally near, the earlier counts. With points left out, their number is the one for which the expected squared error of the slopes, bend and scatter together, is smallest over the run.';
