import { uncertaintyOf } from '../../measure';
import { type Kind, type Sense } from '../document';
import { type PlanModel } from '../model';
import { type Change } from '../compare';
import { type CutFigure, type Meaning, type NoticeItem } from './types';

/** A saw's width: what comes off below it is a pass, not a cut. Common practice, no source. Millimetres. */
export const sawWidth = 3.2;
const slack = 1e-6;

function offBand(made: number, low: number, high: number): number {
  return made > high + slack ? made - high : made < low - slack ? made - low : 0;
}

/** A changed dimension as it was made, against its new band; without a tolerance the instrument's own counts. */
export function cutDimension(
  change: Change,
  before: PlanModel,
  after: PlanModel,
): CutFigure | null {
  const old = before.dimensions.get(change.elementId);
  const now = after.dimensions.get(change.elementId);
  if (!now?.value) return null;
  const read = now.readings ?? null;
  const made = read ? read.value.toNumber() : old?.value?.x;
  if (made === undefined) return null;
  const play = uncertaintyOf(now.dimension.instrument);
  const low = now.band?.low ?? now.value.x - play;
  const high = now.band?.high ?? now.value.x + play;
  const off = offBand(made, low, high);
  return {
    of: 'value',
    made,
    read: read !== null,
    low,
    high,
    off,
    sense: now.dimension.sense,
    kind: now.kind,
  };
}

/** A size that is one symbol and nothing else was made to that dimension's reading. */
function madeSize(text: string, model: PlanModel): number | null {
  const dimension = model.symbols.get(text.trim());
  const state = dimension && dimension.origin !== 'taken' && model.dimensions.get(dimension.id);
  return state ? (state.readings?.value.toNumber() ?? null) : null;
}

/** The sizes of a changed part that moved, as cut by the old revision, against the new ones. */
export function cutPart(change: Change, before: PlanModel): CutFigure[] {
  const old = before.document.parts.find((p) => p.id === change.elementId);
  const moved = change.figures.filter((f) => !f.of.startsWith('features/'));
  return moved.flatMap(({ of, before: was, after: now }) => {
    if (!old || was?.x === null || was?.x === undefined || !now || now.x === null) return [];
    const text = of === 'length' ? old.length : of === 'width' ? old.width : old.thickness;
    const read = madeSize(text, before);
    const [made, low, high] = [read ?? was.x, now.low ?? now.x, now.high ?? now.x];
    const off = offBand(made, low, high);
    const sense: Sense = 'outside';
    const kind: Kind = 'length';
    return [{ of, made, read: read !== null, low, high, off, sense, kind }];
  });
}

type Judged = Pick<NoticeItem, 'means' | 'cure'>;

/** One figure by its sense: outside can lose, inside can be opened, a place moved, a setting set again. */
function judgeFigure({ off, sense, of }: CutFigure): Judged {
  if (off === 0) return { means: 'inside', cure: 'none' };
  if (sense === 'place') return { means: 'work', cure: 'move' };
  if (sense === 'setting') return { means: 'work', cure: 'set' };
  if (sense === 'form') return { means: 'work', cure: 'work' };
  const canLose = sense === 'outside' ? off > 0 : off < 0;
  if (!canLose) return { means: 'cannot', cure: 'none' };
  const planed = of === 'thickness' || sense === 'inside';
  return { means: !planed && off >= sawWidth ? 'recut' : 'work', cure: 'work' };
}

const order: readonly Meaning[] = ['cannot', 'recut', 'work', 'inside'];

/** Several figures of one thing: the worst decides. */
export function judgeFigures(figures: readonly CutFigure[]): Judged {
  const all = figures.map(judgeFigure);
  return (
    order.flatMap((m) => all.find((j) => j.means === m) ?? [])[0] ?? { means: 'done', cure: 'none' }
  );
}
