import { calibrationLine, concentrationFromLine } from '../../src/signal/calibration';
import { convertColumn, convertToRows, requireLine } from '../column';
import { detail, uncertainties } from '../commonParameters';
import { sayStandards } from '../builtIn/standards';
import { defineFunction } from '../define';
import { uncertaintyOf } from '../uncertaintyOf';
import { column, flag, number, optional, readings } from '../parameters';
import { standardRow } from '../results';
import { seriesOf, uncertaintiesOf } from '../run';

export default defineFunction({
  name: 'STANDARDS',
  family: 'reading',
  summary: 'Concentration of an unknown, from its reading and those of standards.',
  equations: {
    lines: ['y = a + bx', 'x = (y − a)/b', 'u_x = √(s²/m + u_a² + x²u_b² + 2xu_ab)/|b|'],
    where: {
      x: 'concentration',
      y: 'reading',
      a: 'intercept; 0 for a line through the origin',
      b: 'slope',
      u_x: 'standard uncertainty of the unknown’s concentration',
      s: 'scatter of the standards about the line',
      m: 'replicates, readings that the unknown’s is the mean of',
      u_a: 'standard uncertainty of the intercept',
      u_b: 'standard uncertainty of the slope',
      u_ab: 'covariance of both',
    },
  },
  method:
    'A straight line by least squares through the readings of the standards, read backwards. A reading more than a tenth of their range beyond the standards is refused (common practice). With detail, the uncertainty is that of the line and of the unknown’s own reading together.',
  uncertainty: uncertaintyOf.line,
  parameters: {
    concentrations: column({ help: 'of the standards' }),
    standards: column({ help: 'readings of the standards, one each' }),
    readings: readings({ help: 'readings of the unknowns, one or many', unit: 'of standards' }),
    uncertainties: uncertainties(),
    origin: optional(flag({ help: 'TRUE for a line through the origin' }), false),
    replicates: optional(
      number({ help: 'how many readings each unknown is the mean of', atLeast: 1, whole: true }),
      1,
    ),
    detail: detail(),
  },
  result: { unit: 'of concentrations', shape: 'as given' },
  example: { formula: '=PACE.STANDARDS({0;2;4},{0.1;0.5;0.9},{0.3;0.7})', equals: [[1], [3]] },
  refusals: [
    {
      formula: '=PACE.STANDARDS({0;2;4},{0.1;0.5;0.9},2)',
      mend: 'Measure a standard beyond the reading, or dilute the sample.',
    },
    {
      formula: '=PACE.STANDARDS({0;2;4},{0.5;0.1;0.52},0.3)',
      mend: 'Check the standards: their readings hardly depend on concentration.',
    },
    {
      formula: '=PACE.STANDARDS({2;2;2},{0.5;0.5;0.51},0.5)',
      mend: 'Measure standards of at least two concentrations.',
    },
  ],
  seeAlso: ['ABSORBANCE', 'CONVERSION', 'COEFFICIENT'],
  reference: 'EURACHEM/CITAC Guide CG 4, 3rd ed. (2012), E.4; doi:10.1351/pac199870040993',
  isLong: { fromCells: 6000 },
  run({ concentrations, standards, readings, uncertainties, origin, replicates, detail }) {
    const series = seriesOf(concentrations, standards);
    const line = calibrationLine(
      {
        concentrations: series.times,
        readings: series.values,
        uncertainties: uncertaintiesOf(series, standards, uncertainties),
      },
      origin,
    );
    if (!detail)
      return convertColumn(readings, (reading) => concentrationFromLine(line, reading, replicates).value);
    requireLine(readings, 'readings');
    return convertToRows(readings, (reading) =>
      standardRow(concentrationFromLine(line, reading, replicates)),
    );
  },
  builtIn: sayStandards,
});
