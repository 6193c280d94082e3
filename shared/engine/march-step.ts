import { DEGREE, fit, integrate, NODES, valueAt } from './chebyshev';

/**
 * One step of the moisture march, on x of [0, 1]: ζ = width·x, distance to equilibrium z = startDistance·exp(−ζ).
 * Arrays are reused from step to step.
 */
export class MarchStep {
  width = 0;
  startDistance = 0;
  /** dt/dx at the nodes, s. */
  readonly pace = new Float64Array(DEGREE + 1);
  /** Oxygen conductance at the nodes, mol/(s·Pa). */
  readonly oxygen = new Float64Array(DEGREE + 1);
  readonly paceCoefficients = new Float64Array(DEGREE + 1);
  readonly timeCoefficients = new Float64Array(DEGREE + 2);

  /** Distances to equilibrium at the nodes. */
  distanceAt(x: number): number {
    return this.startDistance * Math.exp(-this.width * x);
  }

  nodeDistance(node: number): number {
    return this.distanceAt(NODES[node]);
  }

  settleTime(): void {
    fit(this.pace, this.paceCoefficients);
    integrate(this.paceCoefficients, this.timeCoefficients);
  }

  /** Seconds from the start of the step. */
  timeAt(x: number): number {
    return x === 0 ? 0 : valueAt(this.timeCoefficients, x);
  }
}
