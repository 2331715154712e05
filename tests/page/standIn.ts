/** Stands in for Office.js in the add-in's page: Excel's cells in memory, and a workbook's file. Bundled by the test. */
import { CellError } from '../../functions/cell';
import { fakeExcel } from '../taskpane/fakeExcel';
import { fakeOffice, type FakeOffice, type OfficeSetting } from '../taskpane/fakeOffice';
import type { BenchSheets } from '../taskpane/portContract';

type Handler = (...args: unknown[]) => unknown;

export interface StandIn {
  readonly office: FakeOffice;
  /** By id: what Excel would call. */
  readonly functions: ReadonlyMap<string, Handler>;
  select(reference: string): void;
}

/** What the page of the test leaves for it, before anything else. */
interface Left {
  readonly left: { readonly sheets: BenchSheets; readonly file: string; readonly setting: OfficeSetting };
}

const { sheets, file, setting } = (globalThis as unknown as Left).left;
const functions = new Map<string, Handler>();
const { select } = fakeExcel(sheets);
const office = fakeOffice({ ...setting, file: Uint8Array.from(atob(file), (sign) => sign.charCodeAt(0)) });
Object.assign(globalThis, {
  CustomFunctions: {
    associate: (id: string, handler: Handler) => functions.set(id, handler),
    Error: CellError,
  },
  standIn: { office, functions, select } satisfies StandIn,
});
