import type { SheetModel } from '../engine/engine';
import { peroxideKept } from '../../functions/demo/runs';
import { invented, standardHeadings } from './look';
import { SheetBuilder } from './sheet';

const runs = ['F', 'G', 'H', 'I'];

/** Peroxide kept warm, and how long it should last in the store and in the refrigerator. */
export function stability(): SheetModel {
  const last = 5 + peroxideKept.length;
  const t = `A6:A${last}`;
  const fits = (what: string): string[] =>
    runs.map((column) => `=PACE.${what}(${t},${column}6:${column}${last},1)`);
  const [temperatures, coefficients] = ['B18:B21', 'C18:C21'];
  return new SheetBuilder('Stability')
    .block('A1', [['Peroxide kept at four temperatures, titrated with permanganate: 5 H2O2 to 2 MnO4⁻']], {
      bold: true,
    })
    .block('A2', [
      [`${invented} Shelf-life figures defer to the governing guideline and a qualified person.`],
    ])
    .block('B4', [['V / mL', null, null, null, 'c / (mol/L)']], { bold: true })
    .block('A5', [['t / d', '40 °C', '50 °C', '60 °C', '70 °C', '40 °C', '50 °C', '60 °C', '70 °C']], {
      bold: true,
    })
    .block('A6', peroxideKept, { numberFormat: '0.00' })
    .block('F6', [[`=PACE.TITRE(B6:E${last},"0.0200 mol/L","1.00 mL",2.5)`]], { numberFormat: '0.0000' })
    .format('G6:I6', '0.0000')
    .format(`F7:I${last}`, '0.0000')
    .block('B17', [['t / °C', 'k / d⁻¹', 'half life / d']], { bold: true })
    .down('B18', [40, 50, 60, 70])
    .down('C18', fits('COEFFICIENT'), { numberFormat: '0.00000' })
    .down('D18', fits('HALFLIFE'), { numberFormat: '0.0' })
    .block('F17', [['Temperature', ...standardHeadings]], { bold: true })
    .down('F18', ['Ea / (kJ/mol)', 'ln A'])
    .block('G18', [[`=PACE.ARRHENIUS(${temperatures},${coefficients},,TRUE)`]], { numberFormat: '0.00' })
    .format('H18:J18', '0.00')
    .format('G19:J19', '0.00')
    .down('F20', ['ΔH‡ / (kJ/mol)', 'ΔS‡ / (J/(mol K)), k per day', 'ΔG‡ / (kJ/mol) at 25 °C'])
    .block('G20', [[`=PACE.EYRING(${temperatures},${coefficients},,TRUE)`]], { numberFormat: '0.00' })
    .format('H20:J20', '0.00')
    .format('G21:J22', '0.00')
    .down('F24', ['k at 25 °C / d⁻¹', 'k at 5 °C / d⁻¹'])
    .down(
      'G24',
      [
        `=PACE.COEFFICIENTAT(${temperatures},${coefficients},25,,TRUE)`,
        `=PACE.COEFFICIENTAT(${temperatures},${coefficients},5,,TRUE)`,
      ],
      { numberFormat: '0.0E+00' },
    )
    .format('H24:J25', '0.0E+00')
    .down('F27', [
      'until 10 % is gone at 25 °C / d',
      '… no earlier than',
      '… no later than',
      'until 10 % is gone at 5 °C / d',
    ])
    .down(
      'G27',
      [
        '=PACE.TIMETO(0.1,G24,1)',
        '=PACE.TIMETO(0.1,J24,1)',
        '=PACE.TIMETO(0.1,I24,1)',
        '=PACE.TIMETO(0.1,G25,1)',
      ],
      {
        numberFormat: '0',
      },
    )
    .build([9, 10, 12, 13, 10, 32, 12, 20, 12, 12, 19, 14]);
}
