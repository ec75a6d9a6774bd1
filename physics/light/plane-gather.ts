import type { ScenePlane, Vec3 } from './light-documents';

/** Reflected light changes slowly: it is gathered this far apart and joined smoothly between, m. */
const NODE_M = 0.16;

/** Where along one side of a plane light is gathered: its outermost cells always, so that nothing is guessed beyond them. */
function nodesAlong(low: number, high: number, cells: number, most: number): number[] {
  const half = (high - low) / cells / 2;
  const [first, last] = [low + half, high - half];
  const count = Math.min(cells, most, Math.max(2, Math.ceil((last - first) / NODE_M - 1e-9) + 1));
  if (count < 2) return [(low + high) / 2];
  return Array.from({ length: count }, (_, k) => first + ((last - first) * k) / (count - 1));
}

/** Weights of the nodes about a place: Lagrange's cubic through the nearest four, of fewer where there are fewer. */
function weightsAt(at: number, nodes: readonly number[]): { from: number; weights: number[] } {
  const width = Math.min(4, nodes.length);
  const step = nodes.length > 1 ? nodes[1]! - nodes[0]! : 1;
  const below = Math.floor((at - nodes[0]!) / step + 1e-9);
  const from = Math.max(0, Math.min(nodes.length - width, below - 1));
  const near = nodes.slice(from, from + width);
  const weights = near.map((node, k) =>
    near.reduce((product, other, m) => (m === k ? product : (product * (at - other)) / (node - other)), 1),
  );
  return { from, weights };
}

/**
 * A slowly changing light on all cells of a plane, gathered at a grid of nodes.
 *
 * @param most nodes along a side
 * @accuracy against gathering at every cell, in the tents of tests/truth/light: within 0.3 % of the mean, 3 % right beside pipes
 */
export function overPlane(plane: ScenePlane, light: (point: Vec3) => number, most: number): Float64Array {
  const { x0, x1, y0, y1, nx, ny, z } = plane;
  const xs = nodesAlong(x0, x1, nx, most);
  const ys = nodesAlong(y0, y1, ny, most);
  const gathered = ys.map((y) => xs.map((x) => light([x, y, z])));
  const across = Array.from({ length: nx }, (_, i) => weightsAt(x0 + ((i + 0.5) * (x1 - x0)) / nx, xs));
  const along = Array.from({ length: ny }, (_, j) => weightsAt(y0 + ((j + 0.5) * (y1 - y0)) / ny, ys));
  const grid = new Float64Array(nx * ny);
  along.forEach((down, j) =>
    across.forEach((over, i) => {
      let sum = 0;
      down.weights.forEach((wy, b) => {
        const row = gathered[down.from + b]!;
        over.weights.forEach((wx, a) => (sum += wy * wx * row[over.from + a]!));
      });
      grid[j * nx + i] = Math.max(0, sum);
    }),
  );
  return grid;
}
