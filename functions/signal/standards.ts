import { calibrationLine, concentrationFromLine } from '../../src/signal/calibration';
import { convertColumn, convertToRows, requireLine } from '../column';
import { detail, uncertainties } from '../commonParameters';
import { sayStandards } from '../builtIn/standards';
import { defineFunction } from '../define';
import { column, flag, number, optional, readings } from '../parameters';
import { standardRow } from '../results';
import { seriesOf, uncertaintiesOf } from '../run';

export default defineFunction({
  name: 'STANDARDS',
  family: 'reading',
  summary: 'Concentration of an unknown, from its reading and those of standards.',
  method:
    'A straight line by least squares through the standards’ readings, read backwards: x = (y − a)/b, u = (1/|b|)√[s²/m + var(a) + x²var(b) + 2x cov(a,b)]. A reading more than a tenth of their range beyond the standards is refused (common practice).',
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
  reference: 'EURACHEM/CITAC Guide CG 4, 3rd ed. (2012), E.4; doi:10.1351/pac199870040993',
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
