import type { SheetModel } from '../engine/engine';
import { invented, scientific, standardHeadings } from './look';
import { SheetBuilder } from './sheet';

/** Minutes, and absorbance at four doses of activator. */
const readings = [
  [0, 0.804, 0.801, 0.801, 0.799],
  [4, 0.742, 0.696, 0.648, 0.607],
  [8, 0.696, 0.607, 0.524, 0.462],
  [12, 0.653, 0.528, 0.425, 0.348],
  [16, 0.599, 0.462, 0.349, 0.262],
  [20, 0.552, 0.406, 0.28, 0.202],
  [24, 0.519, 0.355, 0.227, 0.149],
  [28, 0.48, 0.31, 0.18, 0.116],
  [32, 0.449, 0.273, 0.146, 0.088],
  [36, 0.42, 0.232, 0.128, 0.064],
  [40, 0.387, 0.211, 0.104, 0.053],
  [44, 0.363, 0.176, 0.074, 0.041],
  [48, 0.343, 0.155, 0.065, 0.029],
  [52, 0.313, 0.14, 0.058, 0.025],
  [56, 0.289, 0.121, 0.044, 0.017],
  [60, 0.266, 0.101, 0.04, 0.015],
];

/** Four runs that share their times, seen together and one of them in detail. */
export function doses(): SheetModel {
  const last = 4 + readings.length;
  const [t, all, one] = [`A5:A${last}`, `B5:E${last}`, `D5:D${last}`];
  return new SheetBuilder('Four doses')
    .block('A1', [['Dye fading at four doses of activator, by absorbance']], { bold: true })
    .block('A2', [[invented]])
    .block('A4', [['t / min', 'A, half', 'A, single', 'A, double', 'A, triple', 'double, fitted']], {
      bold: true,
    })
    .block('A5', readings)
    .down('F5', [`=PACE.CURVE(${t},${one},1)`], { numberFormat: '0.0000' })
    .format(`F6:F${last}`, '0.0000')
    .block('H4', [['All runs, order 1']], { bold: true })
    .block('H5', [[`=PACE.SURVEY(${t},${all},1)`]], { bold: true })
    .look('I5:O5', { bold: true })
    .format('I6:I9', '0')
    .format('J6:K9', scientific)
    .format('L6:L9', '0.00')
    .format('M6:M9', scientific)
    .format('N6:N9', '0.0 %')
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
