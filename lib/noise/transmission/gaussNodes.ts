/** Nodes and weights of the Gauss-Legendre rule of `count` points on (0, 1). Newton's method on the Legendre polynomial. */
export function gaussNodes(count: number): { nodes: Float64Array; weights: Float64Array } {
  const nodes = new Float64Array(count);
  const weights = new Float64Array(count);
  for (let i = 0; i < count; i++) {
    let x = Math.cos((Math.PI * (i + 0.75)) / (count + 0.5));
    let slope = legendreSlope(count, x).slope;
    for (let step = 0; step < 20; step++) {
      const { value, slope: steeper } = legendreSlope(count, x);
      slope = steeper;
      x -= value / slope;
      if (Math.abs(value / slope) < 1e-15) break;
    }
    nodes[i] = (1 - x) / 2;
    weights[i] = 1 / ((1 - x * x) * slope * slope);
  }
  return { nodes, weights };
}

function legendreSlope(count: number, x: number): { value: number; slope: number } {
  let before = 1;
  let value = x;
  for (let n = 2; n <= count; n++) {
    const next = ((2 * n - 1) * x * value - (n - 1) * before) / n;
    before = value;
    value = next;
  }
  return { value, slope: (count * (x * value - before)) / (x * x - 1) };
}
