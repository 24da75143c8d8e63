import { fail, nearest } from './expression-fault';
import { type Node } from './expression-node';
import { functionNames, reservedWords } from './expression';
import { isPlain, kindName, kindPowers, mapPowers, plain, samePowers, type Powers } from './kinds';

/** What the surroundings know about symbols: the powers of one, and all names for a suggestion. */
export interface KindScope {
  powers: (symbol: string) => Powers | undefined;
  names: () => Iterable<string>;
  /** The plan's unit, for cures such as "2 mm?". */
  unit: 'mm' | 'in';
}

const angle = kindPowers('angle');
const length = kindPowers('length');
const argumentCounts: Record<string, [least: number, most: number]> = {
  min: [1, 50],
  max: [1, 50],
  hypot: [1, 50],
  atan2: [2, 2],
  round: [1, 2],
  floor: [1, 2],
  ceil: [1, 2],
};

/** The value of a plain constant exponent, or null. */
function constant(node: Node): number | null {
  if (node.t === 'num') return node.value.toNumber();
  if (node.t === 'neg') {
    const a = constant(node.a);
    return a === null ? null : -a;
  }
  if (node.t === 'bin' && node.op === '/') {
    const [a, b] = [constant(node.a), constant(node.b)];
    return a === null || b === null || b === 0 ? null : a / b;
  }
  return null;
}

/** Two things that should be of one kind; a bare number beside a length gets the unit as a cure. */
function agree(a: Node, ka: Powers, b: Node, kb: Powers, scope: KindScope, verb: string): void {
  if (samePowers(ka, kb)) return;
  const bare = isPlain(kb) ? b : isPlain(ka) ? a : null;
  const other = bare === b ? ka : kb;
  const unit = samePowers(other, length) ? scope.unit : samePowers(other, angle) ? 'deg' : '';
  const message = `${capital(kindName(ka))} and ${kindName(kb)} do not ${verb}.`;
  if (bare?.t === 'num' && unit) fail(bare.at, 'kind', message, `${bare.text} ${unit}?`);
  fail(b.at, 'kind', message, 'Use two of one kind.');
}

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);

function symbol(node: Node & { t: 'sym' }, scope: KindScope): Powers {
  const powers = scope.powers(node.name);
  if (powers) return powers;
  if (reservedWords.has(node.name))
    fail(
      node.at,
      'reserved',
      `${node.name} is a unit or a function.`,
      'Use the symbol of a dimension.',
    );
  const near = nearest(node.name, scope.names());
  return fail(
    node.at,
    'unknown-symbol',
    `There is no dimension ${node.name}.`,
    near ? `Did you mean ${near}?` : 'Add a dimension with this symbol.',
  );
}

function binary(node: Node & { t: 'bin' }, scope: KindScope): Powers {
  const a = kindsOf(node.a, scope);
  const b = kindsOf(node.b, scope);
  if (node.op === '*') return mapPowers(a, (p, i) => p + (b[i] ?? 0));
  if (node.op === '/') return mapPowers(a, (p, i) => p - (b[i] ?? 0));
  if (node.op !== '^') {
    agree(node.a, a, node.b, b, scope, node.op === '+' ? 'add' : 'subtract');
    return a;
  }
  if (!isPlain(b))
    fail(
      node.b.at,
      'kind',
      `An exponent is a plain number, not ${kindName(b)}.`,
      'Use a figure without a unit.',
    );
  if (isPlain(a)) return plain;
  const power = constant(node.b);
  if (power === null)
    fail(
      node.b.at,
      'kind',
      `${capital(kindName(a))} takes a fixed exponent.`,
      'Write the figure, such as ^2.',
    );
  return mapPowers(a, (p) => p * power);
}

function angleArgument(node: Node, powers: Powers, name: string): void {
  if (samePowers(powers, angle)) return;
  const cure = node.t === 'num' ? `${node.text} deg?` : 'Give it an angle, such as 30 deg.';
  fail(node.at, 'kind', `${name} takes an angle, not ${kindName(powers)}.`, cure);
}

function call(node: Node & { t: 'call' }, scope: KindScope): Powers {
  const { name, args } = node;
  if (!functionNames.includes(name)) {
    const near = nearest(name, functionNames);
    fail(
      node.at,
      'unknown-function',
      `There is no function ${name}.`,
      near ? `Did you mean ${near}?` : 'Use + - * / or a function such as min.',
    );
  }
  const [least, most] = argumentCounts[name] ?? [1, 1];
  if (args.length < least || args.length > most)
    fail(
      node.at,
      'arguments',
      `${name} takes ${least === most ? least : `${least} to ${most}`}; here are ${args.length}.`,
      `Write ${name} with ${least === 1 ? 'one figure' : `${least} figures`} in the brackets.`,
    );
  const kinds = args.map((arg) => kindsOf(arg, scope));
  const [first = plain] = kinds;
  const at = args[0] ?? node;
  if (name === 'made' && args[0]?.t !== 'sym')
    fail(at.at, 'arguments', 'made takes the symbol of one dimension.', 'Write made(symbol).');
  if (['sin', 'cos', 'tan'].includes(name)) {
    angleArgument(at, first, name);
    return plain;
  }
  if (name === 'asin' || name === 'acos') {
    if (!isPlain(first))
      fail(
        at.at,
        'kind',
        `${name} takes a plain number, not ${kindName(first)}.`,
        'Divide one length by another.',
      );
    return angle;
  }
  args.slice(1).forEach((arg, i) => {
    agree(at, first, arg, kinds[i + 1] ?? plain, scope, 'go together');
  });
  if (name === 'sqrt') return mapPowers(first, (p) => p / 2);
  if (name === 'atan2') return angle;
  if (['round', 'floor', 'ceil'].includes(name) && args.length === 1 && !isPlain(first))
    fail(
      node.at,
      'arguments',
      `${name} needs to know to what.`,
      `Write ${name}(x, 1 ${scope.unit}).`,
    );
  return first;
}

/** The exponents of what an expression gives. Throws a FaultError on unknown names and unlike kinds. */
export function kindsOf(node: Node, scope: KindScope): Powers {
  switch (node.t) {
    case 'num':
      return plain;
    case 'qty':
      return node.powers;
    case 'sym':
      return symbol(node, scope);
    case 'neg':
      return kindsOf(node.a, scope);
    case 'bin':
      return binary(node, scope);
    case 'call':
      return call(node, scope);
  }
}

/** Refuses an expression whose result is not of the kind declared. */
export function expectKind(node: Node, wanted: Powers, scope: KindScope): void {
  const found = kindsOf(node, scope);
  if (samePowers(found, wanted)) return;
  const unit = samePowers(wanted, length) ? scope.unit : samePowers(wanted, angle) ? 'deg' : '';
  const cure =
    node.t === 'num' && unit
      ? `${node.text} ${unit}?`
      : 'Change the expression, or the kind of the dimension.';
  fail(node.at, 'kind', `This gives ${kindName(found)}, not ${kindName(wanted)}.`, cure);
}

/** Two sides of a comparison must be of one kind. */
export function expectSame(a: Node, b: Node, scope: KindScope): void {
  agree(a, kindsOf(a, scope), b, kindsOf(b, scope), scope, 'compare');
}
