/** The older half of Office.js, as far as it is used: what the host supports, and the workbook's file in slices. */

export interface OfficeSetting {
  /** The workbook's file. */
  readonly file?: Uint8Array;
  /** Requirement sets that this host lacks: `ExcelApi 1.12`. */
  readonly lacks?: readonly string[];
  readonly platform?: string;
  /** Colours of Office; a host without any says nothing. */
  readonly theme?: { readonly isDarkTheme?: boolean; readonly bodyBackgroundColor?: string };
  /** What it answers in place of a file. */
  readonly refusal?: string;
  /** What the document keeps; one that is protected takes nothing. */
  readonly settings?: Map<string, unknown>;
  readonly isProtected?: boolean;
}

export interface FakeOffice {
  /** Workbooks opened beside this one, as Excel was given them. */
  readonly opened: string[];
  /** Files that nobody has closed. */
  unclosed(): number;
  /** What the workbook was told to do when it is opened again. */
  readonly startups: string[];
}

interface Result {
  readonly status: string;
  readonly value?: unknown;
  readonly error?: { readonly message: string };
}
type Done = (result: Result) => void;

/** Call it after the fake of Excel, which it lends the opening of other workbooks. */
export function fakeOffice({
  file,
  lacks = [],
  platform = 'PC',
  refusal,
  theme,
  settings = new Map(),
  isProtected = false,
}: OfficeSetting = {}): FakeOffice {
  const opened: string[] = [];
  const startups: string[] = [];
  let unclosed = 0;
  const succeed = (done: Done, value?: unknown): void => void setTimeout(() => done({ status: 'ok', value }));
  const fail = (done: Done, message: string): void =>
    void setTimeout(() => done({ status: 'failed', error: { message } }));

  function openFile({ sliceSize }: { readonly sliceSize: number }): object {
    const bytes = file!;
    unclosed++;
    return {
      size: bytes.length,
      sliceCount: Math.ceil(bytes.length / sliceSize),
      getSliceAsync(place: number, done: Done) {
        const data = [...bytes.subarray(place * sliceSize, (place + 1) * sliceSize)];
        succeed(done, { data, index: place, size: data.length });
      },
      closeAsync(done: Done) {
        unclosed--;
        succeed(done);
      },
    };
  }

  Object.assign(globalThis, {
    Office: {
      onReady: async () => ({ host: 'Excel', platform }),
      context: {
        host: 'Excel',
        platform,
        officeTheme: theme,
        requirements: {
          isSetSupported: (set: string, version: string) => !lacks.includes(`${set} ${version}`),
        },
        document: {
          settings: {
            get: (name: string) => settings.get(name) ?? null,
            set: (name: string, value: unknown) => void settings.set(name, value),
            saveAsync: (done: Done) =>
              isProtected ? fail(done, 'the document is protected') : succeed(done),
          },
          getFileAsync: (_: unknown, options: { readonly sliceSize: number }, done: Done) =>
            file && !refusal ? succeed(done, openFile(options)) : fail(done, refusal ?? 'there is no file'),
        },
      },
      StartupBehavior: { none: 'None', load: 'Load' },
      addin: {
        getStartupBehavior: async () => startups.at(-1) ?? 'None',
        setStartupBehavior: async (behaviour: string) => void startups.push(behaviour),
      },
      FileType: { Compressed: 'compressed' },
      AsyncResultStatus: { Succeeded: 'ok' },
    },
  });
  Object.assign((globalThis as unknown as { Excel: object }).Excel, {
    createWorkbook: async (base64: string) => void opened.push(base64),
  });
  return { opened, startups, unclosed: () => unclosed };
}
