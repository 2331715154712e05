import type { Answered } from './calls/estimate';
import { allRuns, pickedRuns, type OneOfMany } from './calls/many';
import { compareOrders, givenBy, orderAnswer, type OrderAnswer, type OrderLine } from './calls/order';
import { rateAnswer, type RateAnswer } from './calls/rate';
import { readingAnswer, type ReadingAnswer } from './calls/reading';
import { convertedRuns, type ConvertedRun } from './calls/readings';
import { temperatureAnswer, type TemperatureAnswer } from './calls/temperature';
import {
  firstChoices,
  type EndpointKind,
  type OrderChoice,
  type RateChoice,
  type ReadingChoice,
  type TemperatureChoice,
} from './choices';
import { checkRun, type Check } from './findings';
import { currentInsertion } from './insertions/current';
import type { Insertion } from './insertions/insertion';
import { miniaturePath } from './plots/miniature';
import type { Run, Table } from './runs';
import type { State } from './store';

/** What the steps draw: the state, and what follows from it, worked out when a step asks for it. */
export interface Scene {
  readonly state: State;
  /** Each is `null` while there is no run. */
  readonly check: Check | null;
  readonly reading: ReadingAnswer | null;
  /** All runs that the reading step converts. */
  readonly readings: readonly ConvertedRun[];
  readonly rate: RateAnswer | null;
  readonly order: OrderAnswer | null;
  readonly orders: Answered<readonly OrderLine[]> | null;
  readonly temperature: TemperatureAnswer | null;
  /** Every run of the table, small; and those that were picked. */
  readonly stamps: readonly Stamp[];
  readonly picked: readonly OneOfMany[];
  /** What the open step would write, and whether it has an answer to write. */
  readonly insertion: Insertion | null;
  readonly isAnswered: boolean;
}

/** A run as the strip shows it. */
export interface Stamp {
  readonly key: number;
  readonly name: string;
  readonly path: string;
}

const stampsOf = (table: Table, run: Run): Stamp[] =>
  allRuns(table, run).map(({ key, heading, run: one }) => ({
    key,
    name: heading.text,
    path: miniaturePath(table, one),
  }));

/** One for each pane: what rests on unchanged parts of the state is not calculated again. */
export function createScenes(): (state: State) => Scene {
  const check = remembered(checkRun);
  const rate = remembered((table: Table, run: Run, choice: RateChoice, pointedAt: State['pointedAt']) =>
    rateAnswer(table, run, choice, { sheet: table.sheet, pointedAt }),
  );
  const reading = remembered((table: Table, run: Run, choice: ReadingChoice, pointedAt: State['pointedAt']) =>
    readingAnswer(table, run, choice, { sheet: table.sheet, pointedAt }),
  );
  const readings = remembered(
    (table: Table, run: Run, choice: ReadingChoice, pointedAt: State['pointedAt']) =>
      convertedRuns(table, run, choice, { sheet: table.sheet, pointedAt }),
  );
  const order = remembered((table: Table, run: Run, choice: OrderChoice, pointedAt: State['pointedAt']) =>
    orderAnswer(table, run, choice, { sheet: table.sheet, pointedAt }),
  );
  // the chosen order has no part in it, and it takes the longest
  const orders = remembered(
    (table: Table, run: Run, kind: EndpointKind, endpoint: string, pointedAt: State['pointedAt']) => {
      const choice = { ...firstChoices.order, endpointKind: kind, endpoint };
      return compareOrders(givenBy(table, run, choice, { sheet: table.sheet, pointedAt }));
    },
  );
  const temperature = remembered(
    (table: Table, run: Run, choice: TemperatureChoice, pointedAt: State['pointedAt']) =>
      temperatureAnswer(table, run, choice, { sheet: table.sheet, pointedAt }),
  );
  const stamps = remembered(stampsOf);
  return (state) => {
    const { table, run, pointedAt } = state;
    const { endpointKind, endpoint } = state.order;
    const scene: Scene = {
      state,
      get check() {
        return table && run && check(table, run);
      },
      get reading() {
        return table && run && reading(table, run, state.reading, pointedAt);
      },
      get readings() {
        return table && run ? readings(table, run, state.reading, pointedAt) : [];
      },
      get rate() {
        return table && run && rate(table, run, state.rate, pointedAt);
      },
      get order() {
        return table && run && order(table, run, state.order, pointedAt);
      },
      get orders() {
        return table && run && orders(table, run, endpointKind, endpoint, pointedAt);
      },
      get temperature() {
        return table && run && temperature(table, run, state.temperature, pointedAt);
      },
      get stamps() {
        return table && run ? stamps(table, run) : [];
      },
      get picked() {
        return table && run ? pickedRuns(table, run, state.many) : [];
      },
      get insertion() {
        return currentInsertion(state);
      },
      get isAnswered() {
        return isAnswered(scene);
      },
    };
    return scene;
  };
}

function isAnswered(scene: Scene): boolean {
  const { task, order: choice } = scene.state;
  if (task === 'temperature') return isTemperatureAnswered(scene);
  if (task === 'many' || task === 'lookUp' || task === 'handOver') return scene.insertion !== null;
  if (task === 'reading') return scene.reading?.kind === 'column';
  if (task === 'rate') return scene.rate !== null && scene.rate.kind !== 'refused';
  const { order, orders } = scene;
  if (!order || !orders) return false;
  if (choice.answer === 'orders') return 'ok' in orders;
  return 'ok' in (choice.answer === 'curve' ? order.coefficient : order[choice.answer]);
}

function isTemperatureAnswered({ state, temperature }: Scene): boolean {
  const answer = state.temperature.answer === 'energy' ? temperature?.energy : temperature?.predicted;
  return !!answer && 'ok' in answer;
}

/** Asks again only when something that the answer rests on is another. */
export function remembered<On extends readonly unknown[], A>(ask: (...on: On) => A): (...on: On) => A {
  let last: { readonly on: On; readonly answer: A } | null = null;
  return (...on) => {
    const isKnown = last?.on.every((one, place) => one === on[place]);
    if (!last || !isKnown) last = { on, answer: ask(...on) };
    return last.answer;
  };
}
