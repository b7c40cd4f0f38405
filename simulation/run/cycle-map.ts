import { monotoneCubic, type MonotoneCubic } from '../laws/monotone-cubic';
import { directBalance } from './direct-balance';
import { steadyCycle, type CycleOptions, type SteadyCycle } from './steady-cycle';

/** Ratio of neighbouring resistances of the map. */
const RATIO = 1.5;
const QUANTITIES = ['rms', 'peak', 'lowestBus', 'highestBus', 'sourcePower', 'capacitorVoltage', 'lineCurrent'] as const;

/**
 * The steady cycle against the resistance of the elements together, solved where it is asked for and
 * interpolated monotonically in ln R between.
 */
export class CycleMap {
  private readonly nodes = new Map<number, SteadyCycle>();
  /** Nodes at which no cycle repeats. */
  private readonly without = new Set<number>();
  private fits: Record<keyof SteadyCycle, MonotoneCubic> | null = null;
  private readonly origin: number;

  constructor(
    private readonly options: CycleOptions,
    resistance: number,
    private readonly guess: number,
  ) {
    this.origin = Math.log(Math.max(resistance, 1e-6));
  }

  /** Null where no cycle repeats at that resistance. */
  at(resistance: number): SteadyCycle | null {
    if (this.options.path.source.kind === 'dc') return directBalance(this.options, resistance);
    const x = (Math.log(Math.max(resistance, 1e-6)) - this.origin) / Math.log(RATIO);
    const left = Math.floor(x + 1e-9);
    if (!this.solve(left)) return null;
    // The resistance may stand on a node, and the next one may already be where the load has no balance.
    if (x - left < 1e-6) return this.nodes.get(left)!;
    if (!this.solve(left + 1)) return null;
    [left - 1, left + 2].forEach((k) => this.solve(k));
    const fits = (this.fits ??= this.fit());
    return Object.fromEntries(QUANTITIES.map((name) => [name, fits[name].value(x)])) as unknown as SteadyCycle;
  }

  private solve(k: number): boolean {
    if (this.nodes.has(k)) return true;
    if (this.without.has(k)) return false;
    const nearest = [...this.nodes.entries()].sort(([a], [b]) => Math.abs(a - k) - Math.abs(b - k))[0];
    const found = steadyCycle(this.options, Math.exp(this.origin + k * Math.log(RATIO)), nearest?.[1].capacitorVoltage ?? this.guess);
    if (!found) {
      this.without.add(k);
      return false;
    }
    this.nodes.set(k, found);
    this.fits = null;
    return true;
  }

  private fit(): Record<keyof SteadyCycle, MonotoneCubic> {
    const sorted = [...this.nodes.entries()].sort(([a], [b]) => a - b);
    const x = sorted.map(([k]) => k);
    return Object.fromEntries(QUANTITIES.map((name) => [name, monotoneCubic(x, sorted.map(([, cycle]) => cycle[name]))])) as Record<keyof SteadyCycle, MonotoneCubic>;
  }
}
