import { type Node } from './expression-node';

/** Lowest and highest value. */
export type Interval = readonly [low: number, high: number];
const everything: Interval = [-Infinity, Infinity];
const degree = Math.PI / 180;

const around = (values: number[]): Interval =>
  values.some(Number.isNaN) ? everything : [Math.min(...values), Math.max(...values)];
const times = ([a, b]: Interval, [c, d]: Interval): Interval =>
  around([a * c, a * d, b * c, b * d].map((v) => (Number.isNaN(v) ? 0 : v)));
const rising = (f: (x: number) => number, [a, b]: Interval): Interval => around([f(a), f(b)]);

/** Sine over an interval of degrees, its peaks included. */
function sine([a, b]: Interval): Interval {
  if (!(b - a < 360)) return [-1, 1];
  const reaches = (peak: number) => Math.ceil((a - peak) / 360) * 360 + peak <= b;
  const [low, high] = around([Math.sin(a * degree), Math.sin(b * degree)]);
  return [reaches(-90) ? -1 : low, reaches(90) ? 1 : high];
}

function tangent([a, b]: Interval): Interval {
  const pole = Math.ceil((a - 90) / 180) * 180 + 90 <= b;
  return pole ? everything : rising((x) => Math.tan(x * degree), [a, b]);
}

function raised(base: Interval, [p, q]: Interval): Interval {
  const [a, b] = base;
  if (p !== q) return a > 0 ? around([a ** p, a ** q, b ** p, b ** q]) : everything;
  if (p < 0) return a <= 0 && b >= 0 ? everything : around([a ** p, b ** p]);
  if (Number.isInteger(p))
    return a < 0 && b > 0 && p % 2 === 0 ? [0, Math.max(a ** p, b ** p)] : around([a ** p, b ** p]);
  return rising((x) => Math.max(0, x) ** p, base);
}

const size = ([a, b]: Interval): Interval =>
  a <= 0 && b >= 0 ? [0, Math.max(-a, b)] : around([Math.abs(a), Math.abs(b)]);

function call(name: string, args: Interval[]): Interval {
  const [a = everything, to = [1, 1] as Interval] = args;
  const lows = args.map(([low]) => low);
  const highs = args.map(([, high]) => high);
  switch (name) {
    case 'min':
      return [Math.min(...lows), Math.min(...highs)];
    case 'max':
      return [Math.max(...lows), Math.max(...highs)];
    case 'abs':
      return size(a);
    case 'sqrt':
      return rising((x) => Math.sqrt(Math.max(0, x)), a);
    case 'sin':
      return sine(a);
    case 'cos':
      return sine([a[0] + 90, a[1] + 90]);
    case 'tan':
      return tangent(a);
    case 'asin':
      return rising((x) => Math.asin(Math.max(-1, Math.min(1, x))) / degree, a);
    case 'acos':
      return rising((x) => Math.acos(Math.max(-1, Math.min(1, x))) / degree, a);
    case 'atan2':
      if (to[0] <= 0) return [-180, 180];
      return around(a.flatMap((y) => to.map((x) => Math.atan2(y, x) / degree)));
    case 'hypot': {
      const sizes = args.map(size);
      return [
        Math.hypot(...sizes.map(([low]) => low)),
        Math.hypot(...sizes.map(([, high]) => high)),
      ];
    }
    default:
      return name === 'made' ? a : [a[0] - to[1], a[1] + to[1]];
  }
}

/** Bounds of an expression over bounds of its symbols; never too narrow, often too wide. */
export function bounds(node: Node, of: (symbol: string, made: boolean) => Interval): Interval {
  if (node.t === 'num' || node.t === 'qty') {
    const x = node.value.toNumber();
    return [x, x];
  }
  if (node.t === 'sym') return of(node.name, false);
  if (node.t === 'call') {
    const [first] = node.args;
    if (node.name === 'made' && first?.t === 'sym') return of(first.name, true);
    return call(
      node.name,
      node.args.map((arg) => bounds(arg, of)),
    );
  }
  const a = bounds(node.a, of);
  if (node.t === 'neg') return [-a[1], -a[0]];
  const b = bounds(node.b, of);
  if (node.op === '+') return [a[0] + b[0], a[1] + b[1]];
  if (node.op === '-') return [a[0] - b[1], a[1] - b[0]];
  if (node.op === '*') return times(a, b);
  if (node.op === '^') return raised(a, b);
  return b[0] <= 0 && b[1] >= 0 ? everything : times(a, [1 / b[1], 1 / b[0]]);
}
