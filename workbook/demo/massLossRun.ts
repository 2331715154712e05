import type { SheetModel } from '../engine/engine';
import { fizzByBalance } from '../../functions/demo/runs';
import { columnWidths, invented, orderTableFormats, scientific, standardHeadings } from './look';
import { SheetBuilder } from './sheet';

const interval = 15; // s
/** A whole tablet in a beaker on the balance. */
export function massLossRun(): SheetModel {
  const last = 4 + fizzByBalance.length;
  const [t, left] = [`A5:A${last}`, `D5:D${last}`];
  const sheet = new SheetBuilder('Mass loss')
    .block('A1', [['Fizz run by balance: one tablet in 200 mL of warm water, beaker open']], { bold: true })
    .block('A2', [[invented]])
    .block('A4', [['t / s', 'm / g', 'n(CO2) / mol', 'n(left) / mol']], { bold: true })
    .block(
      'A5',
      fizzByBalance.map((mass, i) => [i * interval, mass]),
    )
    .down('C5', [`=PACE.MASSLOSS(B5:B${last},"CO2",,G6,G5)`], { numberFormat: '0.00000' })
    .down('D5', [`=PACE.REMAINING(C5:C${last},G7)`], { numberFormat: '0.00000' })
    .format(`C6:D${last}`, '0.00000')
    .block('F4', [['Conditions']], { bold: true })
    .block('F5', [
      ['temperature of the gas as it leaves', '31 degC'],
      ['readability of the balance / g', 0.01],
      ['hydrogencarbonate at the start / mol', 0.062],
    ])
    .block('F9', [['Answers', ...standardHeadings]], { bold: true })
    .down('F10', [
      'average rate, 0 to 60 s / (mol/s)',
      'rate at 60 s / (mol/s)',
      'rate coefficient, order 2 / (mol⁻¹ s⁻¹)',
      'half life / s',
    ])
    .down('G10', [`=PACE.BETWEEN(${t},${left},0,60,,TRUE)`, `=PACE.TANGENT(${t},${left},60,,,,TRUE)`], {
      numberFormat: scientific,
    })
    .down('G12', [`=PACE.COEFFICIENT(${t},${left},2,,,TRUE)`], { numberFormat: '0.0000' })
    .down('G13', [`=PACE.HALFLIFE(${t},${left},2,,,TRUE)`], { numberFormat: '0.00' })
    .format('H10:J11', scientific)
    .format('H12:J12', '0.0000')
    .format('H13:J13', '0.00')
    .format('K10:K13', '0.0')
    .block('F15', [['Which order?']], { bold: true })
    .block('F16', [[`=PACE.ORDERS(${t},${left})`]], { bold: true });
  sheet.look('G16:N16', { bold: true });
  for (const [column, format] of Object.entries(orderTableFormats))
    sheet.format(`${column}17:${column}23`, format);
  return sheet.build(columnWidths);
}
