/** Stiff systems over time, with a step that adapts itself, and sensitivities where they are asked for. */
import { newBlocks, RosenbrockStep, type Blocks } from './rosenbrockStep';
import { stages } from './rodas5p';
import type { SensitiveSystem } from './stiffSystem';
import { ToleranceScale } from './toleranceScale';

/** Why an integration could not go on. */
export type StopReason = 'too much work' | 'no step is small enough';

/** The integration stopped itself before its end. */
export class IntegrationStopped extends Error {
  override readonly name = 'IntegrationStopped';
  constructor(
    readonly reason: StopReason,
    /** How far it came. */
    readonly time: number,
    readonly steps: number,
    /** The state there. */
    readonly state: Float64Array,
  ) {
    super(`integration stopped at time ${time} after ${steps} steps: ${reason}`);
  }
}

export interface IntegrationOptions {
  /** Error allowed in one step, relative to the size of each number; 1e-9 when left out. */
  readonly tolerance?: number;
  /** Whether sensitivities are carried along. */
  readonly sensitivities?: boolean;
  /** Called every so many steps: to show how far it is, or to throw and so end it. */
  readonly watch?: (time: number, steps: number) => void;
  /** In multiplications, about; 2.5e8, one or two seconds, when left out. */
  readonly workLimit?: number;
}

export interface Trajectory {
  /** One state a time asked for, in order. */
  readonly states: readonly Float64Array[];
  /** For each time, one s = ∂y/∂θ a parameter; empty where they were not asked for. */
  readonly sensitivities: readonly Blocks[];
  readonly steps: number;
  /** In the unit of the work limit. */
  readonly work: number;
}

const stepsBetweenLooks = 200;

/** By how much one step may differ from the one before it. */
const fastestGrowth = 6;
const fastestShrinking = 0.2;

/** Of the step that would just meet the tolerance. */
const caution = 0.9;

/**
 * @param start the state at time 0, none below 0
 * @param times ascending, 0 or later
 * @throws IntegrationStopped rather than to go on for ever
 * @example integrate(new MassAction(parseScheme('A ->'), Float64Array.of(1), 1e-14), [1], Float64Array.of(1)).states[0][0] // 0.367879441
 */
export function integrate(
  system: SensitiveSystem,
  start: ArrayLike<number>,
  times: Float64Array,
  options: IntegrationOptions = {},
): Trajectory {
  const { tolerance = 1e-9, watch, workLimit = 2.5e8 } = options;
  const parameters = options.sensitivities ? system.parameters : 0;
  const method = new RosenbrockStep(system, parameters);
  const here = newBlocks(system.size, 1 + parameters);
  here[0].set(start);
  const scale = new ToleranceScale(here[0], tolerance);
  const states: Float64Array[] = [];
  const sensitivities: Blocks[] = [];
  const keep = (share: number): void => {
    const kept = here.map((block, i) => {
      const out = new Float64Array(block.length);
      if (share > 0) method.between(here, share, i, out);
      else out.set(block);
      return out;
    });
    states.push(kept[0]);
    if (parameters > 0) sensitivities.push(kept.slice(1));
  };
  const stop = (reason: StopReason): IntegrationStopped =>
    new IntegrationStopped(reason, time, steps, here[0].slice());
  const end = times.length > 0 ? times[times.length - 1] : 0;
  const stepWork = workOfStep(system.size, parameters);
  let time = 0;
  let steps = 0;
  let wanted = 0;
  while (wanted < times.length && times[wanted] <= 0) {
    keep(0);
    wanted++;
  }
  if (wanted === times.length) return { states, sensitivities, steps, work: 0 };
  method.leave(here);
  let step = Math.min(end, firstStep(system, here[0]));
  let mayGrow = fastestGrowth;
  while (wanted < times.length) {
    if (++steps * stepWork > workLimit) throw stop('too much work');
    if (watch && steps % stepsBetweenLooks === 0) watch(time, steps);
    const isLast = time + step * (1 + 1e-12) >= end;
    const length = isLast ? end - time : step;
    if (!(time + length > time)) throw stop('no step is small enough');
    const error = method.attempt(here, length) ? scale.errorOf(here, method.next, method.error) : Infinity;
    if (!(error <= 1)) {
      step = length * Math.max(fastestShrinking, caution * error ** -0.2 || 0);
      mayGrow = 1;
      continue;
    }
    const reached = isLast ? end : time + length;
    for (; wanted < times.length && times[wanted] <= reached; wanted++) {
      keep((times[wanted] - time) / length);
    }
    here.forEach((block, i) => block.set(method.next[i]));
    scale.follow(here[0]);
    time = reached;
    if (wanted === times.length) break;
    method.leave(here);
    step = length * Math.min(mayGrow, Math.max(fastestShrinking, caution * Math.max(error, 1e-12) ** -0.2));
    mayGrow = fastestGrowth;
  }
  return { states, sensitivities, steps, work: steps * stepWork };
}

/** Multiplications of one step, about. */
function workOfStep(size: number, parameters: number): number {
  return size ** 3 / 3 + stages * (1 + parameters) * (size * size + 10 * size) + 200;
}

/** Short beside the time in which what is there would change by its own size. */
function firstStep(system: SensitiveSystem, state: Float64Array): number {
  const slope = new Float64Array(system.size);
  system.derivative(state, slope);
  let largest = 0;
  let fastest = 0;
  for (let i = 0; i < state.length; i++) {
    largest = Math.max(largest, Math.abs(state[i]));
    if (state[i] !== 0) fastest = Math.max(fastest, Math.abs(slope[i] / state[i]));
  }
  for (let i = 0; i < state.length; i++) {
    if (largest > 0) fastest = Math.max(fastest, Math.abs(slope[i]) / largest);
  }
  return fastest > 0 ? 1e-3 / fastest : Infinity;
}
