/** A scatter chart over cells, as Excel draws it. */
import type { ChartToDraw, SheetArea } from '../port';

/** Enough for it to be found again. */
export interface DrawnChart {
  readonly sheet: string;
  readonly name: string;
}

type RangeOf = (area: SheetArea) => Excel.Range;

/** So large in cells of the usual size that its axes can be read. */
const size = { rows: 15, columns: 6 };

/** Its name is known once the context is synchronised. */
export function drawChart(
  sheet: Excel.Worksheet,
  rangeOf: RangeOf,
  { title, axes, series, at }: ChartToDraw,
): Excel.Chart {
  const [first] = series;
  const by = first.y.rows === 1 ? Excel.ChartSeriesBy.rows : Excel.ChartSeriesBy.columns;
  const chart = sheet.charts.add(Excel.ChartType.xyscatter, rangeOf(first.y), by);
  series.forEach(({ name, x, y, isLine }, place) => {
    const drawn = place === 0 ? chart.series.getItemAt(0) : chart.series.add(name);
    drawn.name = name;
    drawn.setXAxisValues(rangeOf(x));
    drawn.setValues(rangeOf(y));
    if (isLine) drawn.chartType = Excel.ChartType.xyscatterSmoothNoMarkers;
  });
  chart.title.text = title;
  chart.axes.categoryAxis.title.text = axes.x;
  chart.axes.valueAxis.title.text = axes.y;
  chart.legend.visible = series.length > 1;
  chart.setPosition(
    rangeOf(at),
    rangeOf({ ...at, row: at.row + size.rows, column: at.column + size.columns }),
  );
  chart.load({ name: true });
  return chart;
}

/** One that the person has taken away, or given another name, is let be. */
export async function removeChart(context: Excel.RequestContext, { sheet, name }: DrawnChart): Promise<void> {
  const chart = context.workbook.worksheets.getItem(sheet).charts.getItemOrNullObject(name);
  chart.load({ name: true });
  await context.sync();
  if (!chart.isNullObject) chart.delete();
}
