import {
  type Answer,
  type Item,
  type Job,
  type LaidSheet,
  type Placement,
  type Sheet,
} from './types';
import { Replay } from './verify-cuts';
import { type Fault } from './verify-fault';

export { type BrokenRule, type Fault } from './verify-fault';

/**
 * Checks an answer against its job: stock, quantities, sizes, grain, edges and kerf, then every cut replayed, in whole
 * numbers. Knows nothing of how the answer was found. Empty when all holds.
 */
export function verifyLayout(job: Job, answer: Answer): Fault[] {
  const faults: Fault[] = [];
  answer.sheets.forEach((laid, i) => {
    const stock = job.sheets[laid.bin];
    if (!stock) {
      faults.push({ rule: 'stock', message: `There is no stock ${laid.bin}.`, sheet: i });
      return;
    }
    faults.push(...placed(job, laid, stock, i), ...apart(job, laid, i));
    faults.push(...new Replay(job, laid, stock, i).run());
  });
  return [...faults, ...quantities(job, answer), ...figures(job, answer)];
}

/** May the part lie this way? Where both have grain it must agree, else it is turned only where it may be. */
function mayLie(item: Item, stock: Sheet, rotated: boolean): boolean {
  const grains = [item.grain, stock.grain].map((g) => (g === 'free' ? undefined : g));
  if (grains[0] !== undefined && grains[1] !== undefined)
    return (grains[0] !== grains[1]) === rotated;
  return !rotated || item.rotatable;
}

function placed(job: Job, laid: LaidSheet, stock: Sheet, sheet: number): Fault[] {
  const faults: Fault[] = [];
  const say = (rule: Fault['rule'], message: string) => faults.push({ rule, message, sheet });
  const { left = 0, right = 0, bottom = 0, top = 0 } = stock.trims ?? {};
  for (const p of laid.placements) {
    const item = job.items[p.item];
    if (!item) {
      say('quantity', `There is no part ${p.item}.`);
      continue;
    }
    if (![p.x, p.y, p.w, p.h].every(Number.isSafeInteger))
      say('whole-numbers', `Part ${p.item} does not lie on whole units.`);
    const [w, h] = p.rotated ? [item.h, item.w] : [item.w, item.h];
    if (p.w !== w || p.h !== h)
      say('size', `Part ${p.item} is ${p.w} × ${p.h}, wanted ${w} × ${h}.`);
    if (!mayLie(item, stock, p.rotated)) say('turned', `Part ${p.item} lies against its grain.`);
    const out =
      p.x < left || p.y < bottom || p.x + p.w > stock.w - right || p.y + p.h > stock.h - top;
    if (out) say('inside', `Part ${p.item} reaches out of the usable sheet.`);
  }
  return faults;
}

/** Any two parts of a sheet are a kerf apart. */
function apart(job: Job, laid: LaidSheet, sheet: number): Fault[] {
  const byX = [...laid.placements].sort((a, b) => a.x - b.x);
  const clash = (a: Placement, b: Placement) =>
    a.y < b.y + b.h + job.kerf && b.y < a.y + a.h + job.kerf;
  for (let i = 0; i < byX.length; i++) {
    const a = byX[i];
    for (let j = i + 1; a && j < byX.length; j++) {
      const b = byX[j];
      if (!b || b.x >= a.x + a.w + job.kerf) break;
      if (!clash(a, b)) continue;
      const message = `Parts ${a.item} and ${b.item} are not a kerf apart.`;
      return [{ rule: 'apart', message, sheet }];
    }
  }
  return [];
}

function quantities(job: Job, answer: Answer): Fault[] {
  const faults: Fault[] = [];
  const used = job.sheets.map(() => 0);
  const found = job.items.map(() => 0);
  for (const laid of answer.sheets) {
    used[laid.bin] = (used[laid.bin] ?? 0) + 1;
    for (const p of laid.placements) found[p.item] = (found[p.item] ?? 0) + 1;
  }
  job.sheets.forEach(({ qty }, i) => {
    if (qty !== null && (used[i] ?? 0) > qty)
      faults.push({
        rule: 'stock',
        message: `${used[i]} of stock ${i} are used, there are ${qty}.`,
      });
  });
  for (const missing of answer.unplaced) {
    found[missing.item] = (found[missing.item] ?? 0) + missing.qty;
    faults.push(...unplaced(job, missing.item, missing.why));
  }
  job.items.forEach(({ qty }, i) => {
    if (found[i] !== Math.max(0, qty))
      faults.push({ rule: 'quantity', message: `Part ${i}: ${found[i]} of ${qty} accounted for.` });
  });
  return faults;
}

function unplaced(job: Job, index: number, why: string): Fault[] {
  const item = job.items[index];
  if (!item || why !== 'too-big') return [];
  const fits = job.sheets.some((stock) => {
    if (stock.qty === 0) return false;
    const { left = 0, right = 0, bottom = 0, top = 0 } = stock.trims ?? {};
    const [W, H] = [stock.w - left - right, stock.h - bottom - top];
    return (
      (mayLie(item, stock, false) && item.w <= W && item.h <= H) ||
      (mayLie(item, stock, true) && item.h <= W && item.w <= H)
    );
  });
  return fits ? [{ rule: 'unplaced', message: `Part ${index} is not too big.` }] : [];
}

function figures(job: Job, answer: Answer): Fault[] {
  const faults: Fault[] = [];
  const count = (stock: Sheet | undefined): number => {
    if (!stock || stock.owned === true) return 0;
    if (answer.objective === 'sheets') return 1;
    return answer.objective === 'area' ? stock.w * stock.h : Math.max(0, stock.cost ?? 0);
  };
  const cost = answer.sheets.reduce((sum, laid) => sum + count(job.sheets[laid.bin]), 0);
  if (cost !== answer.cost)
    faults.push({ rule: 'cost', message: `It counts ${cost}, not ${answer.cost}.` });
  const complete = answer.unplaced.every((missing) => missing.why === 'too-big');
  if (complete && answer.lowerBound > cost)
    faults.push({ rule: 'bound', message: `The bound ${answer.lowerBound} is above ${cost}.` });
  if (answer.proven && (answer.lowerBound !== cost || !complete))
    faults.push({ rule: 'bound', message: 'It is called proven, the bound says otherwise.' });
  return faults;
}
