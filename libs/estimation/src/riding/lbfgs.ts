/** A function's value at x; writes its gradient into `gradient`. */
export type Objective = (x: Float64Array, gradient: Float64Array) => number;

const MEMORY = 10;
const dot = (a: Float64Array, b: Float64Array) => a.reduce((sum, x, i) => sum + x * b[i]!, 0);

/**
 * Minimises a function by L-BFGS with backtracking (Nocedal & Wright, Numerical Optimization, algorithms 7.4 and 3.1);
 * pauses after each step, so that who runs it can do something else in between.
 */
export function* minimise(
  objective: Objective,
  start: Float64Array,
  iterations: number,
): Generator<void, Float64Array> {
  let x = Float64Array.from(start);
  let gradient = new Float64Array(x.length);
  let value = objective(x, gradient);
  const steps: { s: Float64Array; y: Float64Array; rho: number }[] = [];
  for (let iteration = 0; iteration < iterations; iteration++) {
    const direction = descent(gradient, steps);
    const slope = dot(direction, gradient);
    if (slope > -1e-12) break;
    let length = iteration === 0 ? Math.min(1, 1 / Math.sqrt(dot(gradient, gradient))) : 1;
    const nextGradient = new Float64Array(x.length);
    let next = x;
    let nextValue = Infinity;
    for (let tries = 0; tries < 25; tries++, length /= 2) {
      next = x.map((xi, i) => xi + length * direction[i]!);
      nextValue = objective(next, nextGradient);
      if (nextValue <= value + 1e-4 * length * slope) break;
    }
    if (!(nextValue < value)) break;
    const s = next.map((xi, i) => xi - x[i]!);
    const y = nextGradient.map((gi, i) => gi - gradient[i]!);
    const sy = dot(s, y);
    if (sy > 1e-12) steps.push({ s, y, rho: 1 / sy });
    if (steps.length > MEMORY) steps.shift();
    [x, gradient, value] = [next, nextGradient, nextValue];
    yield;
  }
  return x;
}

/** The two-loop recursion: minus the approximate inverse Hessian times the gradient. */
function descent(
  gradient: Float64Array,
  steps: readonly { s: Float64Array; y: Float64Array; rho: number }[],
): Float64Array {
  const q = gradient.map((g) => -g);
  const alphas: number[] = [];
  for (const { s, y, rho } of [...steps].reverse()) {
    const alpha = rho * dot(s, q);
    alphas.unshift(alpha);
    for (let i = 0; i < q.length; i++) q[i]! -= alpha * y[i]!;
  }
  const last = steps.at(-1);
  if (last) {
    const scale = 1 / (last.rho * dot(last.y, last.y));
    for (let i = 0; i < q.length; i++) q[i]! *= scale;
  }
  steps.forEach(({ s, y, rho }, k) => {
    const beta = rho * dot(y, q);
    for (let i = 0; i < q.length; i++) q[i]! += s[i]! * (alphas[k]! - beta);
  });
  return q;
}
