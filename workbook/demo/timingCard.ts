import type { SheetModel } from '../engine/engine';
import { invented, scientific, standardHeadings } from './look';
import { SheetBuilder } from './sheet';

/** Activator and peroxide in parts of the usual dose, and seconds until a stain has lost its colour. */
const timings = [
  [0.5, 1, 359],
  [1, 1, 187],
  [2, 1, 92],
  [1, 0.5, 244],
  [1, 2, 127],
  [2, 2, 64],
];

/** Orders in each reactant from timed colour changes. */
export function timingCard(): SheetModel {
  const last = 4 + timings.length;
  return new SheetBuilder('Timing card')
    .block('A1', [['Time until a stain has lost its colour, at several doses']], { bold: true })
    .block('A2', [[invented]])
    .block('A4', [['activator / dose', 'peroxide / dose', 't / s', '(1/t) / s⁻¹']], { bold: true })
    .block('A5', timings)
    .down('D5', [`=PACE.EVENT(C5:C${last})`], { numberFormat: scientific })
    .format(`D6:D${last}`, scientific)
    .block('F4', [['Orders', ...standardHeadings, 'nearest simple order']], { bold: true })
    .down('F5', ['in activator', 'in peroxide', 'rate coefficient'])
    .block('G5', [[`=PACE.EXPONENTS(D5:D${last},A5:B${last},TRUE)`]], { numberFormat: '0.0000' })
    .format('H5:J5', '0.0000')
    .format('G6:J7', '0.0000')
    .build([17, 16, 9, 13, 3, 18, 12, 21, 13, 13, 19, 21]);
}
