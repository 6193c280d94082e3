import type { StorageSystem } from './storage-system';

/** The food's moisture: where it stands, which limits it has reached and what was to be reported. */
export class MoistureTracker {
  moisture: number;
  maxReachedAtS: number | null = null;
  minReachedAtS: number | null = null;
  readonly report: Float64Array;
  private readonly max: number | undefined;
  private readonly min: number | undefined;
  private readonly reportS: number[];
  private nextReport = 0;

  constructor(system: StorageSystem) {
    this.moisture = system.food.initialMoisture;
    this.max = system.limits.moisture_max_g_per_g;
    this.min = system.limits.moisture_min_g_per_g;
    this.reportS = system.reportS;
    this.report = new Float64Array(system.reportS.length);
    if (this.max !== undefined && this.moisture >= this.max) this.maxReachedAtS = 0;
    if (this.min !== undefined && this.moisture <= this.min) this.minReachedAtS = 0;
    while (this.nextReport < this.reportS.length && this.reportS[this.nextReport] <= 0)
      this.write(this.moisture);
  }

  /**
   * Moves to `moisture` by `untilS`. `whenAt` gives the time at which a moisture in between is passed, `moistureAt` the
   * moisture at a time in between; moisture is monotone within a piece.
   */
  advance(
    moisture: number,
    untilS: number,
    course: { whenAt: (moisture: number) => number; moistureAt: (atS: number) => number },
  ): void {
    if (this.max !== undefined && this.maxReachedAtS === null && moisture >= this.max) {
      this.maxReachedAtS = course.whenAt(this.max);
    }
    if (this.min !== undefined && this.minReachedAtS === null && moisture <= this.min) {
      this.minReachedAtS = course.whenAt(this.min);
    }
    while (this.nextReport < this.reportS.length && this.reportS[this.nextReport] <= untilS) {
      this.write(course.moistureAt(this.reportS[this.nextReport]));
    }
    this.moisture = moisture;
  }

  /** Stands still until `untilS`. */
  rest(untilS: number): void {
    while (this.nextReport < this.reportS.length && this.reportS[this.nextReport] <= untilS)
      this.write(this.moisture);
  }

  finish(): void {
    this.rest(Infinity);
  }

  private write(moisture: number): void {
    this.report[this.nextReport] = moisture;
    this.nextReport += 1;
  }
}
