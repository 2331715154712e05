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
  /** Places of the parameters whose sensitivities are carried along; none when left out. */
  readonly sensitivities?: readonly number[];
  /** Called every so many steps: to show how far it is, or to throw and so end it. */
  readonly watch?: (time: number, steps: number) => void;
  /** In multiplications, about; one or two seconds when left out. */
  readonly workLimit?: number;
}

export interface Trajectory {
  /** One state a time asked for, in order. */
  readonly states: readonly Float64Array[];
  /** For each time, one s = ∂y/∂θ a parameter asked for; empty where none was. */
  readonly sensitivities: readonly Blocks[];
  readonly steps: number;
  /** In the unit of the work limit. */
  readonly work: number;
}

/** In multiplications, about: one or two seconds. */
const mostWork = 2.5e8;

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
  return new Integration(system, start, times, options).run();
}

class Integration {
  private readonly method: RosenbrockStep;
  private readonly scale: ToleranceScale;
  private readonly here: Blocks;
  private readonly states: Float64Array[] = [];
  private readonly sensitivities: Blocks[] = [];
  private readonly stepWork: number;
  private time = 0;
  private steps = 0;

  constructor(
    private readonly system: SensitiveSystem,
    start: ArrayLike<number>,
    private readonly times: Float64Array,
    private readonly options: IntegrationOptions,
  ) {
    const parameters = options.sensitivities ?? [];
    this.method = new RosenbrockStep(system, parameters);
    this.here = newBlocks(system.size, 1 + parameters.length);
    this.here[0].set(start);
    this.scale = new ToleranceScale(this.here[0], options.tolerance ?? 1e-9);
    this.stepWork = workOfStep(system.size, parameters.length);
  }

  run(): Trajectory {
    const end = this.times.at(-1) ?? 0;
    this.keepUpTo(0, 0);
    let step = Math.min(end, firstStep(this.system, this.here[0]));
    let mostGrowth = fastestGrowth;
    if (end > 0) this.method.leave(this.here);
    while (this.time < end) {
      this.countStep();
      const isLast = this.time + step * (1 + 1e-12) >= end;
      const length = isLast ? end - this.time : step;
      const error = this.errorOf(length);
      const change = caution * Math.max(error, 1e-12) ** -0.2;
      if (error <= 1) {
        this.arrive(isLast ? end : this.time + length, length);
        step = length * Math.min(mostGrowth, Math.max(fastestShrinking, change));
        mostGrowth = fastestGrowth;
      } else {
        step = length * Math.max(fastestShrinking, change);
        mostGrowth = 1;
      }
    }
    const { states, sensitivities, steps } = this;
    return { states, sensitivities, steps, work: steps * this.stepWork };
  }

  private countStep(): void {
    const { workLimit = mostWork, watch } = this.options;
    if (++this.steps * this.stepWork > workLimit) throw this.stopped('too much work');
    if (watch && this.steps % stepsBetweenLooks === 0) watch(this.time, this.steps);
  }

  /** Of a step of this length, as a multiple of what is allowed. */
  private errorOf(length: number): number {
    if (!(this.time + length > this.time)) throw this.stopped('no step is small enough');
    const { method, here } = this;
    return method.attempt(here, length) ? this.scale.errorOf(here, method.next, method.error) : Infinity;
  }

  private arrive(reached: number, length: number): void {
    this.keepUpTo(reached, length);
    for (let block = 0; block < this.here.length; block++) this.here[block].set(this.method.next[block]);
    this.scale.follow(this.here[0]);
    this.method.leave(this.here);
    this.time = reached;
  }

  /** What was asked for on the way of a step, read off between its ends. */
  private keepUpTo(reached: number, length: number): void {
    const { times, states, here, time } = this;
    for (let next = states.length; next < times.length && times[next] <= reached; next++) {
      const share = length > 0 ? (times[next] - time) / length : 0;
      const [state, ...sensitivities] = here.map((block, i) => this.at(share, block, i));
      states.push(state);
      if (sensitivities.length > 0) this.sensitivities.push(sensitivities);
    }
  }

  private at(share: number, start: Float64Array, block: number): Float64Array {
    if (share === 0) return start.slice();
    const out = new Float64Array(start.length);
    this.method.between(this.here, share, block, out);
    return out;
  }

  private stopped(reason: StopReason): IntegrationStopped {
    return new IntegrationStopped(reason, this.time, this.steps, this.here[0].slice());
  }
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
