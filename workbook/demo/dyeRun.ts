import type { SheetModel } from '../engine/engine';
import { dyeFading } from '../../functions/demo/runs';
import { columnWidths, invented, orderTableFormats, scientific, standardHeadings } from './look';
import { SheetBuilder } from './sheet';

/** Doses of activator, and the time a stain took to lose its colour. */
const timings = [
  ['single', 184],
  ['double', 95],
  ['triple', 63],
];

/** Bleach activator fading a test dye, followed by absorbance. */
export function dyeRun(): SheetModel {
  const last = 4 + dyeFading.length;
  const [t, a] = [`A5:A${last}`, `B5:B${last}`];
  const sheet = new SheetBuilder('Dye fading')
    .block('A1', [['Test dye fading under bleach activator, by absorbance']], { bold: true })
    .block('A2', [[invented]])
    .block('A4', [['t / min', 'A', 'r / min⁻¹']], { bold: true })
    .block('A5', dyeFading)
    .down('C5', [`=PACE.ALONG(${t},${a})`], { numberFormat: scientific })
    .format(`C6:C${last}`, scientific)
    .block('F4', [['Conditions']], { bold: true })
    .block('F5', [['absorbance when all dye is gone', 0.006]])
    .block('F9', [['Answers', ...standardHeadings]], { bold: true })
    .down('F10', ['average rate, 0 to 30 min / min⁻¹', 'rate at 30 min / min⁻¹'])
    .down('F12', ['rate coefficient, order 1 / min⁻¹', 'half life / min'])
    .down('G10', [`=PACE.BETWEEN(${t},${a},0,30,,TRUE)`, `=PACE.TANGENT(${t},${a},30,,,,TRUE)`], {
      numberFormat: scientific,
    })
    .down('G12', [`=PACE.COEFFICIENT(${t},${a},1,G5,,TRUE)`], { numberFormat: '0.00000' })
    .down('G13', [`=PACE.HALFLIFE(${t},${a},1,G5,,TRUE)`], { numberFormat: '0.00' })
    .format('H10:J11', scientific)
    .format('H12:J12', '0.00000')
    .format('H13:J13', '0.00')
    .format('K10:K13', '0.0')
    .block('F15', [['Which order?']], { bold: true })
    .block('F16', [[`=PACE.ORDERS(${t},${a},G5)`]], { bold: true })
    .block('F26', [['Timing card: stain gone', 't / s', '(1/t) / s⁻¹']], { bold: true })
    .block('F27', timings)
    .down('H27', ['=PACE.EVENT(G27:G29)'], { numberFormat: scientific })
    .format('H28:H29', scientific);
  sheet.look('G16:N16', { bold: true });
  for (const [column, format] of Object.entries(orderTableFormats))
    sheet.format(`${column}17:${column}23`, format);
  return sheet.build(columnWidths);
}
