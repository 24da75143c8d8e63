import { difference, intersection } from 'polyclip-ts';

type Point = [number, number];
type Poly = Point[][];

/** To a grid of 1e-9 mm: an edge on the fence lies on it exactly. */
const grid = (mm: number) => Math.round(mm * 1e9) / 1e9 + 0;

/**
 * Five cuts of a board at a saw whose fence and blade meet at 90° + error on the board's side, done by clipping polygons
 * (npm polyclip-ts, MIT): the fence lies along −x from the origin, the board above it, the blade leaves the origin
 * at the board's right. After each cut the board turns clockwise, its fresh edge to the fence.
 */
export interface Shop {
  /** Radians. */
  error: number;
  kerf: number;
  /** Taken off along the fence by each cut, mm. */
  trim: number;
  fifthTrim?: number;
}

export interface Strip {
  fenceEnd: number;
  otherEnd: number;
  length: number;
}

const far = 4_000;

/** The half plane left of the line from the origin at this angle to −y, shifted right by `offset`. */
function leftOf(error: number, offset: number): Poly {
  const along: Point = [Math.sin(error), Math.cos(error)];
  const right: Point = [Math.cos(error), -Math.sin(error)];
  const at = (a: number, r: number): Point => [
    along[0] * a + right[0] * r,
    along[1] * a + right[1] * r,
  ];
  return [[at(-far, offset), at(far, offset), at(far, offset - far), at(-far, offset - far)]];
}

const ring = (shape: readonly Poly[]): Point[] => (shape[0]?.[0] ?? []).slice(0, -1);

/** The board moved so that the edge from a to b lies on the fence, b at its right, beyond the blade by the trim. */
function laid(board: readonly Point[], a: Point, b: Point, trim: number): Point[] {
  const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
  const [c, s] = [(b[0] - a[0]) / length, (b[1] - a[1]) / length];
  const turned = board.map(([x, y]): Point => {
    const [dx, dy] = [x - a[0], y - a[1]];
    return [dx * c + dy * s, -dx * s + dy * c];
  });
  // The stop for the trim: the corner that lies on the fence.
  return turned.map(([x, y]): Point => [grid(x - length + trim), grid(y)]);
}

/** The two ends of the edge that lies on the blade's line, the one at the fence first. */
function freshEdge(board: readonly Point[], error: number): [Point, Point] {
  const off = ([x, y]: Point) => Math.abs(x * Math.cos(error) - y * Math.sin(error));
  const [a, b] = board.toSorted((p, q) => off(p) - off(q));
  if (!a || !b) throw new Error('the board is gone');
  return a[1] < b[1] ? [a, b] : [b, a];
}

/** Width of a strip square to its fresh edge, at a distance along it. */
function widthAt(strip: readonly Point[], from: Point, to: Point, s: number): number {
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
  const [ux, uy] = [(to[0] - from[0]) / length, (to[1] - from[1]) / length];
  const [nx, ny] = [uy, -ux];
  const [px, py] = [from[0] + ux * s, from[1] + uy * s];
  let widest = 0;
  strip.forEach((a, i) => {
    const b = strip[(i + 1) % strip.length] ?? a;
    const [ex, ey] = [b[0] - a[0], b[1] - a[1]];
    const cross = nx * ey - ny * ex;
    if (Math.abs(cross) < 1e-12) return;
    const t = ((a[0] - px) * ey - (a[1] - py) * ex) / cross;
    const u = ((a[0] - px) * ny - (a[1] - py) * nx) / cross;
    if (u >= -1e-9 && u <= 1 + 1e-9) widest = Math.max(widest, t);
  });
  return widest;
}

/** Cuts a blank five times and measures the strip near its ends; null when it runs out to a point. */
export function fiveCuts(blank: readonly Point[], shop: Shop): Strip | null {
  const { error, kerf, trim } = shop;
  let board: Point[] = [...blank];
  let [a, b]: [Point, Point] = [board[0] ?? [0, 0], board[1] ?? [0, 0]];
  for (let cut = 1; cut <= 5; cut += 1) {
    const off = cut === 5 ? (shop.fifthTrim ?? trim) : trim;
    const placed: Poly = [laid(board, a, b, off)];
    const kept = ring(intersection(placed, leftOf(error, 0)));
    if (cut === 5) {
      const strip = ring(difference(placed, leftOf(error, kerf)));
      if (strip.length < 4) return null;
      const [from, to] = freshEdge(
        strip.map(([x, y]): Point => [x - kerf * Math.cos(error), y + kerf * Math.sin(error)]),
        error,
      ).map(([x, y]): Point => [x + kerf * Math.cos(error), y - kerf * Math.sin(error)]) as [
        Point,
        Point,
      ];
      const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
      // Square to the fresh edge, so near the end the line still meets the other long edge.
      const margin = 4;
      return {
        fenceEnd: widthAt(strip, from, to, margin),
        otherEnd: widthAt(strip, from, to, length - margin),
        length: length - 2 * margin,
      };
    }
    board = kept;
    [a, b] = freshEdge(board, error);
  }
  return null;
}

/** A blank a little out of true, its first edge at the fence: corners moved by up to `off` mm. */
export function blankOf(w: number, h: number, off: number, random: () => number): Point[] {
  const jog = () => (random() - 0.5) * 2 * off;
  return [
    [0, 0],
    [w + jog(), 0],
    [w + jog(), h + jog()],
    [jog(), h + jog()],
  ];
}
