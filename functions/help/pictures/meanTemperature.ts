import { line, type Place } from '../../drawing/frame';
import { plainNumber } from '../../format';
import { columnOf, numberOf } from './answers';
import { note, panel, panelFrame } from './panel';
import type { Picture } from './picture';

/** A store in the invented lab: °C at noon of each day, with a few hot days. */
export const history = [16, 16, 17, 17, 18, 19, 24, 31, 34, 33, 27, 20, 18, 17, 17, 16, 16, 15, 15, 16, 16];
const energies = [50, 83.144, 150];

export const meanKinetic = (energy?: number): number =>
  numberOf('MEANTEMP', columnOf(history), undefined, energy);

export function meanTemperature(): Picture {
  const plain = history.reduce((sum, one) => sum + one, 0) / history.length;
  const kinetic = meanKinetic();
  const frame = panelFrame([0, history.length], [10, ...history]);
  const steps: Place[] = history.flatMap((y, day) => [
    { x: day, y },
    { x: day + 1, y },
  ]);
  const level = (y: number): Place[] => [0, history.length].map((x) => ({ x, y }));
  return {
    name: 'mean-kinetic-temperature',
    title: 'Hot days count for more',
    functions: ['MEANTEMP'],
    caption: `Three weeks in a store with a few hot days. The plain mean is ${plainNumber(plain, 3)} °C; the mean kinetic temperature, the one steady temperature at which as much would have reacted, is ${plainNumber(kinetic, 3)} °C. The steeper a reaction rises with temperature, the more the hot days count: ${energies.map((energy) => `${plainNumber(meanKinetic(energy), 3)} °C at ${plainNumber(energy)} kJ/mol`).join(', ')}.`,
    panels: [
      panel(
        {
          heading: 'Three weeks in a store',
          frame,
          x: 'day',
          y: 'temperature / °C',
          says: `plain mean ${plainNumber(plain, 3)} °C, mean kinetic temperature ${plainNumber(kinetic, 3)} °C`,
        },
        line(frame, steps, 'stem'),
        line(frame, level(plain), 'curve'),
        line(frame, level(kinetic), 'rate-line'),
        note(frame, { x: history.length, y: kinetic }, 'mean kinetic', { anchor: 'end', by: [0, -5] }),
        note(frame, { x: history.length, y: plain }, 'plain mean', { anchor: 'end', by: [0, 13] }),
      ),
    ],
  };
}
