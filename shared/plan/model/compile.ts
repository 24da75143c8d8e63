import {
  expectKind,
  expectSame,
  type ExpressionFacts,
  type ExpressionFault,
  factsOf,
  FaultError,
  kindOf,
  kindPowers,
  type KindScope,
  kindsOf,
  type Node,
  parseCheck,
  parseExpression,
  parseLength,
  type CheckNode,
} from '../../measure';
import { type Kind } from '../document';

/** An expression ready to evaluate, or why it is not. */
export type Compiled<T extends Node | CheckNode = Node> =
  | { ok: true; node: T; facts: ExpressionFacts }
  | { ok: false; fault: ExpressionFault; facts: ExpressionFacts };

const noFacts: ExpressionFacts = { inputs: [], curved: false };
const length = kindPowers('length');
/** A field that is one figure and nothing else: digits, marks of fractions and units, no spaced sign. */
const figureOnly =
  /^[\d\s.,/⁄∕½⅓⅔¼¾⅕⅖⅗⅘⅙⅚⅛⅜⅝⅞'"′″’”‘“-]*(?:mm|cm|m|in|inch|inches|ft|foot|feet|thou)?\.?\s*$/;

/** A field holding only a figure takes the plan's unit, or the base unit of its kind. */
function fieldFigure(text: string, kind: Kind, scope: KindScope): Compiled | null {
  if (kind === 'length') {
    const read = parseLength(text, { unit: scope.unit });
    if (read.ok)
      return {
        ok: true,
        node: { t: 'qty', value: read.value.mm, powers: length, text, at: 0 },
        facts: noFacts,
      };
    const spaced = /\S\s+-\s|-\s*\(/.test(text) || read.code === 'negative';
    if (!figureOnly.test(text) || spaced || read.code === 'empty') return null;
    return {
      ok: false,
      fault: { at: read.at, code: 'literal', message: read.message, cure: read.cure },
      facts: noFacts,
    };
  }
  const parsed = parseExpression(text);
  if (!parsed.ok || parsed.node.t !== 'num') return null;
  const node: Node = { ...parsed.node, t: 'qty', powers: kindPowers(kind) };
  return { ok: true, node, facts: noFacts };
}

const figures = new Map<string, Compiled>();

/** Compiles a field of a kind: a bare figure takes the plan's unit, anything else is an expression. */
export function compileField(text: string, kind: Kind, scope: KindScope): Compiled {
  if (!/^[A-Za-z_(]/.test(text)) {
    const key = `${kind} ${scope.unit} ${text}`;
    const known = figures.get(key) ?? fieldFigure(text, kind, scope);
    if (known) {
      if (figures.size > 5000) figures.clear();
      figures.set(key, known);
      return known;
    }
  }
  const read = parseExpression(text);
  if (!read.ok) return { ok: false, fault: read.fault, facts: noFacts };
  return checked(read.node, factsOf(read.node), () => {
    expectKind(read.node, kindPowers(kind), scope);
  });
}

function checked<T extends Node | CheckNode>(
  node: T,
  facts: ExpressionFacts,
  run: () => void,
): Compiled<T> {
  try {
    run();
    return { ok: true, node, facts };
  } catch (error) {
    if (error instanceof FaultError) return { ok: false, fault: error.fault, facts };
    throw error;
  }
}

/** Of what a check's margins are. */
export function checkKind(compiled: Compiled<CheckNode>, scope: KindScope): Kind {
  const [first] = compiled.ok ? compiled.node.args : [];
  return (first && kindOf(kindsOf(first, scope))) ?? 'length';
}

/** Compiles a check; both sides of each comparison must be of one kind. */
export function compileCheck(text: string, scope: KindScope): Compiled<CheckNode> {
  const read = parseCheck(text);
  if (!read.ok) return { ok: false, fault: read.fault, facts: noFacts };
  const { args } = read.node;
  return checked(read.node, factsOf(...args), () => {
    const [first, ...others] = args;
    if (first) kindsOf(first, scope);
    for (const other of others) if (first) expectSame(first, other, scope);
  });
}

/** Any expression, whatever its kind; a bare figure is a length in the plan's unit. */
export function compileAny(text: string, scope: KindScope): Compiled {
  const read = parseExpression(text);
  if (!read.ok || read.node.t === 'num') return compileField(text, 'length', scope);
  return checked(read.node, factsOf(read.node), () => {
    kindsOf(read.node, scope);
  });
}
