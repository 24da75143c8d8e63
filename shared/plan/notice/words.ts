import { displayMm, displayValue, type DisplayPreference } from '../../measure';
import { type CutFigure, type Meaning, type NoticeItem, type StockNeed } from './types';

const short: Record<Meaning, string> = {
  cannot: 'cannot be saved',
  make: 'to make',
  missed: 'passed already',
  recut: 'cut it again',
  work: 'can be worked',
  measure: 'measure it',
  done: 'done the old way',
  inside: 'still good',
  'not-needed': 'no longer needed',
  'nothing-cut': 'nothing cut yet',
  'not-reached': 'not reached yet',
};

/** A meaning in two or three words. */
export const meaningWord = (means: Meaning): string => short[means];

const amount = (figure: CutFigure, pref: DisplayPreference) =>
  displayValue(Math.abs(figure.off), figure.kind, pref, true).text.replace(/^\+/, '');

/** The stock a part made again takes, as `B × 2 from birch ply: 300 × 120 × 18 mm`. */
export function needText(need: StockNeed, pref: DisplayPreference): string {
  const size = [need.length, need.width, need.thickness]
    .map((x) => (x === null ? '–' : displayMm(x, pref).text))
    .join(' × ');
  const times = need.quantity > 1 ? ` × ${need.quantity}` : '';
  return `${need.mark}${times}${need.stock ? ` from ${need.stock}` : ''}: ${size}`;
}

/** What of an item the words need. */
type Described = Pick<NoticeItem, 'means' | 'cure' | 'figures' | 'needs' | 'assumed'>;

function workText(item: Described, figure: CutFigure, off: string): string {
  const over = figure.off > 0 ? 'over' : 'under';
  const where = figure.of === 'value' ? '' : ` in ${figure.of}`;
  const said = `${off} ${over}${where}`;
  if (item.cure === 'move') return `${said}: move it while it is not fixed.`;
  if (item.cure === 'set') return `${said}: set it again.`;
  if (item.means === 'recut') return `${said}: cut it again to the new size.`;
  if (figure.sense === 'inside') return `${said}: open it up.`;
  return figure.sense === 'form' ? `${said}: true it up.` : `${said}: work it down.`;
}

/** What an item asks of the builder, in a sentence or two. */
export function describeItem(item: Described, pref: DisplayPreference): string {
  const worst = [...item.figures].sort((a, b) => Math.abs(b.off) - Math.abs(a.off))[0];
  const tail = item.assumed ? ' Nothing was read: measure before you trust this.' : '';
  const off = worst ? amount(worst, pref) : '';
  switch (item.means) {
    case 'cannot': {
      const over = worst && worst.off > 0 ? 'over' : 'under';
      const needs = item.needs.map((n) => needText(n, pref)).join('; ');
      const again = needs ? ` Make it again: ${needs}.` : ' What it meets can be made to suit.';
      return `${off} ${over}, and that cannot be put back.${again}${tail}`;
    }
    case 'make':
      return `To make, and its step is past: ${item.needs.map((n) => needText(n, pref)).join('; ')}.`;
    case 'missed':
      return 'New, before where you are. Read it before you go on.';
    case 'recut':
    case 'work':
      return worst ? `${workText(item, worst, off)}${tail}` : '';
    case 'measure':
      return 'You have cut this, and the new size cannot be worked out from here. Measure it.';
    case 'done':
      return 'You did this the old way. Read it again.';
    case 'inside':
      return `What you made is inside the new tolerance.${tail}`;
    case 'not-needed':
      return 'No longer part of the plan. Keep it as a spare.';
    case 'nothing-cut':
      return 'Reached, and nothing is cut yet: go on with the new figure.';
    case 'not-reached':
      return 'You have not come to this yet.';
  }
}
