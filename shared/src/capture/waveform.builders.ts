/** Analytic signals for the tests: what a measure should find is known from how they are made. */

export interface Trapezoid {
  readonly periodSeconds: number;
  readonly delaySeconds: number;
  /** From the low to the high level, and back. */
  readonly riseSeconds: number;
  readonly topSeconds: number;
  readonly fallSeconds: number;
  readonly low: number;
  readonly high: number;
}

/** Value of a trapezoid at an instant; before its delay it rests low. */
export function trapezoidAt(shape: Trapezoid, seconds: number): number {
  const since = seconds - shape.delaySeconds;
  if (since < 0) return shape.low;
  const phase = since - Math.floor(since / shape.periodSeconds + 1e-12) * shape.periodSeconds;
  const amplitude = shape.high - shape.low;
  if (phase < shape.riseSeconds) return shape.low + (amplitude * phase) / shape.riseSeconds;
  if (phase <= shape.riseSeconds + shape.topSeconds) return shape.high;
  const falling = phase - shape.riseSeconds - shape.topSeconds;
  return falling < shape.fallSeconds ? shape.high - (amplitude * falling) / shape.fallSeconds : shape.low;
}

export interface Rectangle {
  readonly hertz: number;
  readonly duty: number;
  readonly low: number;
  readonly high: number;
  readonly delaySeconds: number;
}

/** Value of an ideal rectangle at an instant, on both sides of its delay unless it rests before. */
export function rectangleAt(shape: Rectangle, seconds: number, restsBefore = true): number {
  const since = seconds - shape.delaySeconds;
  if (restsBefore && since < 0) return shape.low;
  const phase = since * shape.hertz - Math.floor(since * shape.hertz);
  return phase < shape.duty ? shape.high : shape.low;
}

/** Instants and samples of a signal. */
export function sample(
  signal: (seconds: number) => number,
  hertz: number,
  count: number,
): readonly [Float64Array, Float64Array] {
  const times = Float64Array.from({ length: count }, (_, index) => index / hertz);
  return [times, times.map(signal)];
}
