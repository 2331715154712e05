/** Charts of the stand-in for Excel: what is asked for takes effect at sync, and a name is there only when loaded. */
import { areaName, type Area } from '../../functions/address';

interface Ranged {
  /** Of the mock's own cells. */
  readonly place: Area & { readonly sheet: string };
}

export interface FakeSeries {
  name: string;
  chartType: string;
  x?: string;
  y?: string;
}

export interface FakeChart {
  readonly sheet: string;
  readonly series: FakeSeries[];
  readonly title: { text: string };
  readonly axes: Record<'categoryAxis' | 'valueAxis', { readonly title: { text: string } }>;
  readonly legend: { visible: boolean };
  position?: string;
}

export interface FakeCharts {
  readonly shown: readonly FakeChart[];
  /** A sheet's collection, as the code under test sees it. */
  on(sheet: string): object;
  commit(): void;
}

const nameOf = ({ place }: Ranged): string => areaName(place);

export function fakeCharts(): FakeCharts {
  const shown: (FakeChart & { readonly ownName: string })[] = [];
  const pending: (() => void)[] = [];

  function add(sheet: string, type: string, source: Ranged): object {
    const series: FakeSeries[] = [{ name: 'Series1', chartType: type, y: nameOf(source) }];
    const chart = {
      sheet,
      series,
      title: { text: '' },
      axes: { categoryAxis: { title: { text: '' } }, valueAxis: { title: { text: '' } } },
      legend: { visible: true },
      ownName: `Chart ${shown.length + pending.length + 1}`,
    } as FakeChart & { ownName: string };
    pending.push(() => shown.push(chart));
    return seen(chart, {
      series: {
        getItemAt: (place: number) => seriesSeen(series[place]),
        add(name: string) {
          series.push({ name, chartType: type });
          return seriesSeen(series[series.length - 1]);
        },
      },
      setPosition: (from: Ranged, to: Ranged) => (chart.position = `${nameOf(from)} to ${nameOf(to)}`),
    });
  }

  const seriesSeen = (series: FakeSeries): object =>
    Object.assign(series, {
      setXAxisValues: (range: Ranged) => (series.x = nameOf(range)),
      setValues: (range: Ranged) => (series.y = nameOf(range)),
    });

  function seen(chart: (typeof shown)[number] | undefined, more: object = {}): object {
    let isAsked = false;
    return {
      ...chart,
      ...more,
      isNullObject: chart === undefined,
      load: () => (isAsked = true),
      get name() {
        if (!isAsked) throw new Error('the name of the chart was not loaded');
        return chart?.ownName;
      },
      delete: () => pending.push(() => shown.splice(shown.indexOf(chart!), 1)),
    };
  }

  return {
    shown,
    on: (sheet) => ({
      add: (type: string, source: Ranged) => add(sheet, type, source),
      getItemOrNullObject: (name: string) =>
        seen(shown.find((one) => one.sheet === sheet && one.ownName === name)),
    }),
    commit: () => pending.splice(0).forEach((change) => change()),
  };
}
