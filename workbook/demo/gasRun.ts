import type { SheetModel } from '../engine/engine';
import { fizzByBurette } from '../../functions/demo/runs';
import { columnWidths, invented, orderTableFormats, scientific, standardHeadings } from './look';
import { SheetBuilder } from './sheet';

/** A tablet's fizz caught over water. */
export function gasRun(): SheetModel {
  const last = 4 + fizzByBurette.length;
  const [t, n] = [`A5:A${last}`, `C5:C${last}`];
  const sheet = new SheetBuilder('Gas run')
    .block('A1', [['Fizz run by gas burette: a quarter tablet in 50 mL of water']], { bold: true })
    .block('A2', [[invented]])
    .block('A4', [['t / s', 'V / mL', 'n / mol', 'r / (mol/s)']], { bold: true })
    .block('A5', fizzByBurette)
    .down('C5', [`=PACE.GASVOLUME(B5:B${last},G5,G6,G7)`], { numberFormat: scientific })
    .down('D5', [`=PACE.ALONG(${t},${n})`], { numberFormat: scientific })
    .format(`C6:D${last}`, scientific)
    .block('F4', [['Conditions']], { bold: true })
    .block('F5', [
      ['temperature of the gas', '21.4 degC'],
      ['pressure of the room', '100.6 kPa'],
      ['over water, so saturated with it', true],
    ])
    .block('F9', [['Answers', ...standardHeadings]], { bold: true })
    .down('F10', [
      'average rate, 0 to 60 s / (mol/s)',
      'rate at 60 s / (mol/s)',
      'rate coefficient, order 1 / s⁻¹',
      'half life / s',
    ])
    .down(
      'G10',
      [
        `=PACE.BETWEEN(${t},${n},0,60,,TRUE)`,
        `=PACE.TANGENT(${t},${n},60,,,,TRUE)`,
        `=PACE.COEFFICIENT(${t},${n},1,"free",,TRUE)`,
      ],
      { numberFormat: scientific },
    )
    .down('G13', [`=PACE.HALFLIFE(${t},${n},1,"free",,TRUE)`], { numberFormat: '0.00' })
    .format('H10:J12', scientific)
    .format('H13:J13', '0.00')
    .format('K10:K13', '0.0')
    .block('F15', [['Which order?']], { bold: true })
    .block('F16', [[`=PACE.ORDERS(${t},${n},"free")`]], { bold: true });
  sheet.look('G16:N16', { bold: true });
  for (const [column, format] of Object.entries(orderTableFormats)) {
    sheet.format(`${column}17:${column}23`, format);
  }
  return sheet.build(columnWidths);
}
