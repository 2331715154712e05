import { pressureLeft } from '../../src/signal/gasPressure';
import { convertColumn } from '../column';
import { sayTotalPressure } from '../builtIn/linear';
import { defineFunction } from '../define';
import { uncertaintyOf } from '../uncertaintyOf';
import { number, readings } from '../parameters';

export default defineFunction({
  name: 'TOTALPRESSURE',
  family: 'reading',
  summary: 'Pressure of a gas that is left, from the total pressure while it turns into other gases.',
  equations: {
    lines: ['p_A = p₀ − (p − p₀)/Δν'],
    where: {
      p_A: 'pressure of A that is left',
      'p₀': 'pressure of A at the start',
      p: 'total pressure read',
      Δν: 'gain, the moles of gas gained for each mole of A used',
    },
  },
  method:
    'Volume and temperature are constant, and A is alone at the start. Count the gain for one mole of A: for 2 A → 4 B + C, five moles of gas come from two, so Δν = 3/2.',
  uncertainty: uncertaintyOf.conversion,
  parameters: {
    totals: readings({ help: 'total pressure, one or many', unit: 'of start', atLeast: 0 }),
    start: number({ help: 'pressure of A alone, before the reaction', unit: 'of totals', above: 0 }),
    gain: number({ help: 'moles of gas gained per mole of A: 1.5 for 2 A → 5 other gases; not 0' }),
  },
  result: { unit: 'of totals', shape: 'as given' },
  // 2 N2O5 → 4 NO2 + O2: at 55.1, 8.7 have been gained and 5.8 used
  example: { formula: '=PACE.TOTALPRESSURE({46.4;55.1},46.4,1.5)', equals: [[46.4], [40.6]] },
  refusals: [
    {
      formula: '=PACE.TOTALPRESSURE({46.4;120},46.4,1.5)',
      mend: 'Check the gain and the start: more was formed than A could give.',
    },
    {
      formula: '=PACE.TOTALPRESSURE({46.4;50},46.4,0)',
      mend: 'If the number of gas molecules stays the same, follow the run by something else than pressure.',
    },
  ],
  seeAlso: ['COEFFICIENT', 'ORDERS', 'GASPRESSURE'],
  reference: 'doi:10.1351/goldbook.S06025',
  caution:
    'Pressure in closed glass can burst it: stay below what the vessel is made for, with a shield and a relief valve. Local rules come first.',
  run: ({ totals, start, gain }) => convertColumn(totals, (total) => pressureLeft(total, start, gain)),
  builtIn: sayTotalPressure,
});
