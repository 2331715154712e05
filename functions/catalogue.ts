/** All cell functions, in the order of the work. */
import type { CellFunction } from './define';
import coefficient from './order/coefficient';
import halfLife from './order/halfLife';
import orders from './order/orders';
import along from './rate/along';
import between from './rate/between';
import event from './rate/event';
import tangent from './rate/tangent';
import gasVolume from './signal/gasVolume';
import massLoss from './signal/massLoss';
import remaining from './signal/remaining';

export const catalogue: readonly CellFunction[] = [
  gasVolume,
  massLoss,
  remaining,
  between,
  tangent,
  along,
  event,
  orders,
  coefficient,
  halfLife,
];

export const functionNamed = (name: string): CellFunction | undefined =>
  catalogue.find((f) => f.name === name.toUpperCase());
