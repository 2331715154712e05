/** All cell functions, in the order of the work. */
import type { CellFunction } from './define';
import coefficient from './order/coefficient';
import halfLife from './order/halfLife';
import orders from './order/orders';
import unit from './order/unit';
import along from './rate/along';
import between from './rate/between';
import event from './rate/event';
import tangent from './rate/tangent';
import course from './scheme/course';
import check from './series/check';
import absorbance from './signal/absorbance';
import acidity from './signal/acidity';
import clock from './signal/clock';
import conductivity from './signal/conductivity';
import conversion from './signal/conversion';
import dissolved from './signal/dissolved';
import gasPressure from './signal/gasPressure';
import gasVolume from './signal/gasVolume';
import massLoss from './signal/massLoss';
import remaining from './signal/remaining';
import standards from './signal/standards';
import titre from './signal/titre';
import totalPressure from './signal/totalPressure';
import arrhenius from './temperature/arrhenius';
import coefficientAt from './temperature/coefficientAt';
import eyring from './temperature/eyring';
import meanTemp from './temperature/meanTemp';
import timeTo from './temperature/timeTo';

export const catalogue: readonly CellFunction[] = [
  clock,
  gasVolume,
  gasPressure,
  totalPressure,
  dissolved,
  massLoss,
  acidity,
  absorbance,
  conductivity,
  titre,
  standards,
  conversion,
  remaining,
  between,
  tangent,
  along,
  event,
  orders,
  coefficient,
  halfLife,
  unit,
  arrhenius,
  eyring,
  coefficientAt,
  meanTemp,
  timeTo,
  course,
  check,
];

export const functionNamed = (name: string): CellFunction | undefined =>
  catalogue.find((f) => f.name === name.toUpperCase());
