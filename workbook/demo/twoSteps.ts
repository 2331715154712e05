import type { SheetModel } from '../engine/engine';
import { dyeInTwoSteps } from '../../functions/demo/runs';
import { invented, standardHeadings } from './look';
import { SheetBuilder } from './sheet';

/** A dye that fades by way of a pale intermediate. */
export function twoSteps(): SheetModel {
  const last = 4 + dyeInTwoSteps.length;
  const t = `A5:A${last}`;
  return new SheetBuilder('Two steps')
    .block('A1', [['A dye that fades by way of a pale intermediate']], { bold: true })
    .block('A2', [[invented]])
    .block(
      'A4',
      [['t / min', 'dye', 'pale', 'clear', null, 'dye, fitted', 'pale, fitted', 'clear, fitted']],
      { bold: true },
    )
    .block('A5', dyeInTwoSteps)
    .block('F5', [[`=PACE.COURSE(K5,K12:K13,K6:K8,${t})`]], { numberFormat: '0.0000' })
    .format('G5:H5', '0.0000')
    .format(`F6:H${last}`, '0.0000')
    .block('J4', [['Mechanism']], { bold: true })
    .block('J5', [
      ['scheme', 'dye -> pale; pale -> clear'],
      ['dye at the start / (mmol/L)', 0.1],
      ['pale at the start / (mmol/L)', 0],
      ['clear at the start / (mmol/L)', 0],
    ])
    .block('J11', [['Fitted', ...standardHeadings]], { bold: true })
    .down('J12', ['k of the first step / min⁻¹', 'k of the second step / min⁻¹'])
    .block('K12', [[`=PACE.FITCOURSE(K5,{0.1;0.01},K6:K8,${t},B5:D${last},TRUE)`]], {
      numberFormat: '0.00000',
    })
    .format('L12:N12', '0.00000')
    .format('K13:N13', '0.00000')
    .format('O12:O13', '0')
    .block('J16', [['When to read next time, for the first step alone']], { bold: true })
    .block('J17', [['=PACE.PLAN(1,K12,K6,0.0006,6)']], { numberFormat: '0.0' })
    .format('J18:J23', '0.0')
    .format('K18', '0.00000')
    .build([9, 9, 9, 9, 3, 13, 13, 13, 3, 32, 32, 20, 12, 12, 19, 40]);
}
