/** The weight that hangs from a beam: a trapezoid, narrow at the top. `x` is its middle, `y` its top edge. */
export function outlinePoise(x: number, y: number, width: number, height: number): string {
  const shoulder = width * 0.3;
  const half = width / 2;
  return `M${x - shoulder} ${y}H${x + shoulder}L${x + half} ${y + height}H${x - half}Z`;
}

/** The lower half of the same weight, filled when the margin is tight. */
export function outlineLowerHalf(x: number, y: number, width: number, height: number): string {
  const half = width / 2;
  const middle = width * 0.4;
  return `M${x - middle} ${y + height / 2}H${x + middle}L${x + half} ${y + height}H${x - half}Z`;
}
