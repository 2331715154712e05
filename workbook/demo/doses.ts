import type { SheetModel } from '../engine/engine';
import { dyeAtFourDoses } from '../../functions/demo/runs';
import { invented, scientific, standardHeadings } from './look';
import { SheetBuilder } from './sheet';

/** Four runs that share their times, seen together and one of them in detail. */
export function doses(): SheetModel {
  const last = 4 + dyeAtFourDoses.length;
  const [t, all, one] = [`A5:A${last}`, `B5:E${last}`, `D5:D${last}`];
  return new SheetBuilder('Four doses')
    .block('A1', [['Dye fading at four doses of activator, by absorbance']], { bold: true })
    .block('A2', [[invented]])
    .block('A4', [['t / min', 'A, half', 'A, single', 'A, double', 'A, triple', 'double, fitted']], {
      bold: true,
    })
    .block('A5', dyeAtFourDoses)
    .down('F5', [`=PACE.CURVE(${t},${one},1)`], { numberFormat: '0.0000' })
    .format(`F6:F${last}`, '0.0000')
    .block('H4', [['All runs, order 1']], { bold: true })
    .block('H5', [[`=PACE.SURVEY(${t},${all},1)`]], { bold: true })
    .look('I5:O5', { bold: true })
    .format('H6:I9', '0')
    .format('J6:K9', scientific)
    .format('L6:L9', '0.00')
    .format('M6:M9', scientific)
    .format('N6:N9', '0.0 %')
    .look('O6:O9', {})
    .block('H12', [['The double dose', ...standardHeadings]], { bold: true })
    .down('H13', ['initial rate / min⁻¹', 'order, fitted'])
    .down('I13', [`=PACE.START(${t},${one},,,TRUE)`, `=PACE.ORDER(${t},${one},,,TRUE)`], {
      numberFormat: '0.0000',
    })
    .format('J13:L14', '0.0000')
    .format('M13:M14', '0.0')
    .block('H16', [['successive half lives / min', 'unit of k at this order']], { bold: true })
    .down('H17', [`=PACE.HALVINGS(${t},${one})`], { numberFormat: '0.0' })
    .format('H18:H24', '0.0')
    .block('I17', [['=PACE.UNIT(1,"mol/L","min")']])
    .block('A24', [['What to look at in the double dose']], { bold: true })
    .block('A25', [[`=PACE.CHECK(${t},${one})`]])
    .build([9, 9, 9, 9, 9, 14, 3, 30, 22, 20, 20, 12, 14, 20, 50]);
}
