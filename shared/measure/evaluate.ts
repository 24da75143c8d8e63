import {
  add,
  compare,
  divide,
  type Dual,
  exact,
  multiply,
  negate,
  power,
  subtract,
  through,
} from './dual';
import { fail, FaultError, type ExpressionFault } from './expression-fault';
import { type Node } from './expression-node';
import { Rational } from './rational';

/** Gives the value of a symbol; `made` asks for what was actually made of it. */
export type Lookup = (symbol: string, made: boolean) => Dual;

const degree = Math.PI / 180;
const finite = (value: Dual, node: Node): Dual =>
  Number.isFinite(value.x)
    ? value
    : fail(node.at, 'domain', 'The result is too large to be a size.', 'Check the figures.');

function binary(node: Node & { t: 'bin' }, lookup: Lookup): Dual {
  const a = evaluateNode(node.a, lookup);
  const b = evaluateNode(node.b, lookup);
  switch (node.op) {
    case '+':
      return add(a, b);
    case '-':
      return subtract(a, b);
    case '*':
      return finite(multiply(a, b), node);
    case '/':
      if (b.x === 0)
        return fail(
          node.b.at,
          'division-by-zero',
          'This divides by zero.',
          'Correct what is divided by.',
        );
      return finite(divide(a, b), node);
    case '^':
      if (a.x === 0 && b.x < 0)
        return fail(
          node.b.at,
          'division-by-zero',
          'Zero has no negative power.',
          'Correct the base.',
        );
      if (a.x < 0 && !Number.isInteger(b.x))
        return fail(
          node.a.at,
          'domain',
          'A figure below zero has no such root.',
          'Use abs, or correct the base.',
        );
      return finite(power(a, b), node);
  }
}

const trig: Record<string, (a: Dual, node: Node) => Dual> = {
  sin: (a) => through(a, Math.sin(a.x * degree), Math.cos(a.x * degree) * degree),
  cos: (a) => through(a, Math.cos(a.x * degree), -Math.sin(a.x * degree) * degree),
  tan: (a, node) => {
    const c = Math.cos(a.x * degree);
    if (Math.abs(c) < 1e-12)
      fail(
        node.at,
        'domain',
        'The tangent of a right angle has no value.',
        'Use an angle below 90 deg.',
      );
    return through(a, Math.tan(a.x * degree), degree / (c * c));
  },
  asin: (a, node) => inverse(a, node, Math.asin(a.x), 1),
  acos: (a, node) => inverse(a, node, Math.acos(a.x), -1),
  sqrt: (a, node) => {
    if (a.x < 0)
      fail(
        node.at,
        'domain',
        'A figure below zero has no root.',
        'Check the order of the subtraction.',
      );
    const root = Math.sqrt(a.x);
    return through(a, root, root === 0 ? 0 : 0.5 / root);
  },
  abs: (a) => through(a, Math.abs(a.x), Math.sign(a.x), a.q?.abs() ?? null),
  made: (a) => a,
};

function inverse(a: Dual, node: Node, radians: number, sign: number): Dual {
  if (a.x < -1 || a.x > 1)
    fail(
      node.at,
      'domain',
      'Sine and cosine stay between -1 and 1.',
      'Check which length is divided by which.',
    );
  const root = Math.sqrt(1 - a.x * a.x);
  return through(a, radians / degree, root === 0 ? 0 : sign / root / degree);
}

/** round, floor, ceil to a step: flat between the steps, so the slope is 0. */
function stepped(node: Node & { t: 'call' }, a: Dual, to: Dual): Dual {
  if (to.x <= 0)
    fail(
      node.args[1]?.at ?? node.at,
      'division-by-zero',
      'The step must be above zero.',
      'Give a step such as 1 mm.',
    );
  const q = (a.q ?? Rational.fromNumber(a.x)).over(to.q ?? Rational.fromNumber(to.x));
  const count =
    node.name === 'round' ? q.round() : node.name === 'floor' ? q.floor() : -q.negate().floor();
  const steps = Rational.of(count);
  return { x: Number(count) * to.x, q: a.q && to.q ? steps.times(to.q) : null, g: null };
}

function call(node: Node & { t: 'call' }, lookup: Lookup): Dual {
  const [first] = node.args;
  if (node.name === 'made' && first?.t === 'sym') return lookup(first.name, true);
  const args = node.args.map((arg) => evaluateNode(arg, lookup));
  const [a = exact(Rational.zero), b = exact(Rational.one)] = args;
  switch (node.name) {
    case 'min':
      return args.reduce((low, arg) => (compare(arg, low) < 0 ? arg : low), a);
    case 'max':
      return args.reduce((high, arg) => (compare(arg, high) > 0 ? arg : high), a);
    case 'hypot': {
      const square = args.map((arg) => multiply(arg, arg)).reduce((sum, arg) => add(sum, arg));
      const root = Math.hypot(...args.map((arg) => arg.x));
      return through(square, root, root === 0 ? 0 : 0.5 / root);
    }
    case 'atan2': {
      const r = a.x * a.x + b.x * b.x;
      const angle = Math.atan2(a.x, b.x) / degree;
      const scale = r === 0 ? 0 : 1 / (r * degree);
      const slope = subtract(
        { x: 0, q: null, g: through(a, 0, b.x * scale).g },
        { x: 0, q: null, g: through(b, 0, a.x * scale).g },
      );
      return { x: angle, q: null, g: slope.g };
    }
    case 'round':
    case 'floor':
    case 'ceil':
      return stepped(node, a, b);
    default:
      return trig[node.name]?.(a, node) ?? a;
  }
}

/** Evaluates a tree. Throws a FaultError with the column on division by zero and outside a function's domain. */
export function evaluateNode(node: Node, lookup: Lookup): Dual {
  switch (node.t) {
    case 'num':
    case 'qty':
      return exact(node.value);
    case 'sym':
      return lookup(node.name, false);
    case 'neg':
      return negate(evaluateNode(node.a, lookup));
    case 'bin':
      return binary(node, lookup);
    case 'call':
      return call(node, lookup);
  }
}

/** The same with the fault as a value. */
export function evaluate(
  node: Node,
  lookup: Lookup,
): { ok: true; value: Dual } | { ok: false; fault: ExpressionFault } {
  try {
    return { ok: true, value: evaluateNode(node, lookup) };
  } catch (error) {
    if (error instanceof FaultError) return { ok: false, fault: error.fault };
    throw error;
  }
}
