import { dots, line } from '../../drawing/frame';
import { plainNumber } from '../../format';
import { columnOf, numbersOf } from './answers';
import { band, curveOf, note, panel, panelFrame } from './panel';
import type { Picture } from './picture';

/** As in the run of the demo: mL, kPa, °C. */
const [volume, pressure, room] = [50, 100.6, 21.4];

/** Amounts in mmol at temperatures in °C. */
export const amounts = (temperatures: readonly number[], wet: boolean): number[] =>
  numbersOf('GASVOLUME', columnOf(temperatures.map(() => volume)), columnOf(temperatures), pressure, wet).map(
    (n) => n * 1000,
  );

export function wetGas(): Picture {
  const temperatures = curveOf(5, 60, (x) => x).map(({ x }) => x);
  const [dry, wet] = [false, true].map((is) =>
    amounts(temperatures, is).map((y, i) => ({ x: temperatures[i], y })),
  );
  const tooMuch = dry.map(({ x, y }, i) => ({ x, y: 100 * (y / wet[i].y - 1) }));
  const share = (temperature: number): number =>
    100 * (amounts([temperature], false)[0] / amounts([temperature], true)[0] - 1);
  const frame = panelFrame([0, 60], [1.3, 2.2]);
  const errors = panelFrame([0, 60], [0, ...tooMuch.map(({ y }) => y)]);
  const mark = { x: room, y: share(room) };
  return {
    name: 'wet-gas',
    title: 'Wet gas and dry gas',
    functions: ['GASVOLUME', 'DISSOLVED'],
    caption: `${volume} mL over water at ${pressure} kPa hold less gas than they seem: the rest is water vapour. Taken for dry, the amount comes out ${plainNumber(share(room), 2)} % too high at ${room} °C and ${plainNumber(share(50), 2)} % at 50 °C. With wet TRUE, PACE.GASVOLUME takes the vapour off.`,
    panels: [
      panel(
        {
          heading: `What ${volume} mL hold`,
          frame,
          x: 'temperature / °C',
          y: 'n / mmol',
          says: 'amount against temperature, taken for dry and as wet as it is; they part as it gets warmer',
        },
        band(frame, wet, dry),
        line(frame, dry, 'curve'),
        line(frame, wet, 'rate-line'),
        note(frame, dry[34], 'taken for dry', { by: [4, -6] }),
        note(frame, wet[34], 'wet TRUE', { anchor: 'end', by: [-8, 14] }),
        note(frame, { x: 53, y: (dry[38].y + wet[38].y) / 2 }, 'water vapour', {
          anchor: 'middle',
          by: [0, 4],
        }),
      ),
      panel(
        {
          heading: 'By how much dry is too high',
          frame: errors,
          x: 'temperature / °C',
          y: 'too high by / %',
          says: `${plainNumber(share(room), 2)} % at ${room} °C, ${plainNumber(tooMuch.at(-1)!.y, 2)} % at 60 °C`,
        },
        line(errors, tooMuch, 'rate-line'),
        dots(errors, [mark], 'touch'),
        note(errors, mark, `${plainNumber(mark.y, 2)} % at ${room} °C`, { anchor: 'end', by: [4, -10] }),
      ),
    ],
  };
}
