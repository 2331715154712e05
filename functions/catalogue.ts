/** All cell functions, in the order of the work. */
import type { CellFunction } from './define';
import coefficient from './order/coefficient';
import curve from './order/curve';
import exponents from './order/exponents';
import halfLife from './order/halfLife';
import halvings from './order/halvings';
import normalTime from './order/normalTime';
import order from './order/order';
import orders from './order/orders';
import overlayOrder from './order/overlayOrder';
import survey from './order/survey';
import unit from './order/unit';
import plan from './plan/plan';
import along from './rate/along';
import between from './rate/between';
import event from './rate/event';
import start from './rate/start';
import tangent from './rate/tangent';
import course from './scheme/course';
import fitCourse from './scheme/fitCourse';
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
  start,
  event,
  orders,
  order,
  coefficient,
  unit,
  halfLife,
  halvings,
  curve,
  exponents,
  normalTime,
  overlayOrder,
  survey,
  arrhenius,
  eyring,
  coefficientAt,
  meanTemp,
  timeTo,
  course,
  fitCourse,
  plan,
  check,
];

export const functionNamed = (name: string): CellFunction | undefined =>
  catalogue.find((f) => f.name === name.toUpperCase());
