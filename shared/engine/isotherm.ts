/** Moisture X [g water per g dry matter] as a function of water activity a, and back; X rises with a. */
export interface Isotherm {
  /** X at an activity. */
  moisture(activity: number): number;
  /** a at a moisture, held within 0 to 1. */
  activity(moisture: number): number;
  /** dX/da at an activity within 0 to 1. */
  slope(activity: number): number;
  isLinear: boolean;
  /** True where moisture grows without bound as the activity comes near. */
  isUnboundedAt(activity: number): boolean;
}

/** At K = 1 and saturation the hyperbola has no bound; this keeps it a number, far beyond any food. */
const NEAREST_TO_POLE = 1e-15;

const held = (activity: number): number => (activity > 0 ? (activity < 1 ? activity : 1) : 0);

/** X = slope·a + intercept. Range: slope > 0. */
export function linearIsotherm(slope: number, intercept: number): Isotherm {
  return {
    moisture: (activity) => slope * activity + intercept,
    activity: (moisture) => held((moisture - intercept) / slope),
    slope: () => slope,
    isLinear: true,
    isUnboundedAt: () => false,
  };
}

/**
 * GAB: X = X_m C K a / [(1 − Ka)(1 − Ka + CKa)]. Range: X_m, C > 0, 0 < K ≤ 1; at K = 1 moisture has no bound at
 * saturation. Inverted in closed form: α u² + β u − X = 0 for u = Ka, α = X(C − 1), β = X_m C − X(C − 2), by the
 * root that keeps its digits.
 */
export function gabIsotherm(Xm: number, C: number, K: number): Isotherm {
  return {
    moisture: (activity) => {
      const u = K * activity;
      return (Xm * C * u) / (Math.max(NEAREST_TO_POLE, 1 - u) * (1 + (C - 1) * u));
    },
    activity: (moisture) => {
      if (!(moisture > 0)) return 0;
      const alpha = moisture * (C - 1);
      const beta = Xm * C - moisture * (C - 2);
      const root = Math.sqrt(Math.max(0, beta * beta + 4 * alpha * moisture));
      const u = beta > 0 ? (2 * moisture) / (beta + root) : (root - beta) / (2 * alpha);
      return held(u / K);
    },
    slope: (activity) => {
      const u = K * activity;
      const denominator = Math.max(NEAREST_TO_POLE, 1 - u) * (1 + (C - 1) * u);
      return (K * Xm * C * (1 + (C - 1) * u * u)) / (denominator * denominator);
    },
    isLinear: false,
    isUnboundedAt: (activity) => K * activity >= 1 - NEAREST_TO_POLE,
  };
}
