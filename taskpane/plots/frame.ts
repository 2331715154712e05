/** The drawing of a plot, as elements of the page. */
import { plot as drawnPlot } from '../../functions/drawing/frame';
import type { Shape } from '../../functions/drawing/shape';
import { svg } from '../h';

export { dots, frameFor, line, size, type Frame, type Place } from '../../functions/drawing/frame';

export const plot = (...parts: Parameters<typeof drawnPlot>): SVGElement => elementOf(drawnPlot(...parts));

const elementOf = ({ tag, attributes, children }: Shape): SVGElement =>
  svg(
    tag as keyof SVGElementTagNameMap,
    attributes,
    ...children.map((child) => (typeof child === 'string' ? child : elementOf(child))),
  );
