/** A function with its gradient, which it writes into the array it is given. */
export type Differentiable = (at: Float64Array, gradient: Float64Array) => number;

export interface Maximum {
  at: Float64Array;
  value: number;
  /** Standard errors by the curvature at the maximum; Infinity along directions without one. */
  standardErrors: Float64Array;
}

const STEPS = 40;
const DIFFERENCE = 1e-4;
/** No step moves a parameter by more than this. */
const LONGEST = 0.5;
/** Steps below this are done with; a value may fall by this much, for rounding and tabled functions. */
const SHORTEST = 1e-5;
const SLACK = 1e-5;

/** Maximum of a smooth function of a few parameters by Newton's method, the curvature taken by differences of gradients. */
export function maximise(f: Differentiable, start: Float64Array): Maximum {
  let at = start;
  const gradient = new Float64Array(at.length);
  let value = f(at, gradient);
  let hessian = curvature(f, at);
  for (let i = 0; i < STEPS; i++) {
    const step = solveSymmetric(hessian, gradient);
    const longest = step.reduce((most, x) => Math.max(most, Math.abs(x)), 0);
    if (longest < SHORTEST) break;
    let share = Math.min(1, LONGEST / longest);
    let next = at.map((x, k) => x + share * step[k]!);
    let nextValue = f(next, gradient);
    while (nextValue < value - SLACK && share > 1e-3) {
      share /= 4;
      next = at.map((x, k) => x + share * step[k]!);
      nextValue = f(next, gradient);
    }
    at = next;
    value = nextValue;
    // Near the top the last curvature does: only a long step asks for a new one.
    if (share * longest > 0.02) hessian = curvature(f, at);
  }
  const standardErrors = new Float64Array(at.length).map((_, k) => {
    const unit = new Float64Array(at.length);
    unit[k] = 1;
    return Math.sqrt(Math.max(solveSymmetric(hessian, unit)[k]!, 0));
  });
  return { at, value, standardErrors };
}

/** Minus the matrix of second derivatives, symmetric. */
function curvature(f: Differentiable, at: Float64Array): Float64Array[] {
  const rows = Array.from(at, (_, k) => {
    const up = new Float64Array(at.length);
    const down = new Float64Array(at.length);
    f(at.with(k, at[k]! + DIFFERENCE), up);
    f(at.with(k, at[k]! - DIFFERENCE), down);
    return up.map((x, i) => (down[i]! - x) / (2 * DIFFERENCE));
  });
  return rows.map((row, k) => row.map((x, i) => (x + rows[i]![k]!) / 2));
}

/** Solves A x = b for symmetric A by Cholesky's decomposition, its diagonal raised where A is not positive definite. */
function solveSymmetric(a: readonly Float64Array[], b: Float64Array): Float64Array {
  const n = b.length;
  const l = a.map((row) => Float64Array.from(row));
  for (let i = 0; i < n; i++) {
    for (let j = 0; j <= i; j++) {
      let sum = a[i]![j]!;
      for (let k = 0; k < j; k++) sum -= l[i]![k]! * l[j]![k]!;
      l[i]![j] = i === j ? Math.sqrt(Math.max(sum, 1e-3 * Math.abs(a[i]![i]!) + 1e-9)) : sum / l[j]![j]!;
    }
  }
  const x = Float64Array.from(b);
  for (let i = 0; i < n; i++) {
    for (let k = 0; k < i; k++) x[i]! -= l[i]![k]! * x[k]!;
    x[i]! /= l[i]![i]!;
  }
  for (let i = n - 1; i >= 0; i--) {
    for (let k = i + 1; k < n; k++) x[i]! -= l[k]![i]! * x[k]!;
    x[i]! /= l[i]![i]!;
  }
  return x;
}
