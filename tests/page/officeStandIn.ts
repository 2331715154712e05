/**
 * What Office.js sets up in the add-in's page, over a sheet in memory: put in its place, so that the page that is
 * shipped can be tried without Excel.
 */
import { fakeExcel } from '../taskpane/fakeExcel';

export interface ExcelSide {
  /** By id: what Excel would call. */
  readonly handlers: Map<string, (...args: unknown[]) => unknown>;
  readonly startupBehaviours: string[];
}

const side: ExcelSide = { handlers: new Map(), startupBehaviours: [] };

class ExcelError {
  constructor(
    readonly code: string,
    readonly message?: string,
  ) {}
}

Object.assign(globalThis, {
  excelSide: side,
  Office: {
    context: { host: 'Excel', platform: 'PC' },
    onReady: () => Promise.resolve({ host: 'Excel', platform: 'PC' }),
    StartupBehavior: { none: 'None', load: 'Load' },
    addin: {
      getStartupBehavior: () => Promise.resolve(side.startupBehaviours.at(-1) ?? 'None'),
      setStartupBehavior: (behaviour: string) => Promise.resolve(void side.startupBehaviours.push(behaviour)),
    },
  },
  CustomFunctions: {
    Error: ExcelError,
    associate: (id: string, handler: (...args: unknown[]) => unknown) => void side.handlers.set(id, handler),
  },
});

fakeExcel({
  Run: [['t / s', 'V / mL'], ...[0, 20, 40, 60, 90, 120].map((t) => [t, 58 * (1 - Math.exp(-0.0161 * t))])],
}).select('Run!A2');
