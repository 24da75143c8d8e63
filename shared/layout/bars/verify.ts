import { type BarAnswer, type BarJob, type BarSheet } from './types';

interface Piece {
  from: number;
  to: number;
}

/** Saws one bar by its printed list and says what of it cannot be done. */
function replay(job: BarJob, bar: BarSheet, name: string): string[] {
  const faults: string[] = [];
  const whole = job.stock[bar.stock]?.length ?? 0;
  let rest: Piece = { from: 0, to: whole };
  const pieces: Piece[] = [];
  let dust = 0;
  for (const cut of bar.cuts) {
    if (cut.at < rest.from || cut.at >= rest.to) {
      faults.push(`${name}: cut ${cut.n} at ${cut.at} is not on what is left`);
      continue;
    }
    if (cut.at - rest.from !== cut.setting)
      faults.push(
        `${name}: cut ${cut.n} is ${cut.at - rest.from} from the end, not ${cut.setting}`,
      );
    const narrow = cut.kind === 'trim' ? job.trim.start : rest.to - cut.at;
    if (cut.kerf !== Math.min(job.kerf, narrow))
      faults.push(`${name}: cut ${cut.n} is ${cut.kerf} wide`);
    if (cut.at > rest.from) pieces.push({ from: rest.from, to: cut.at });
    dust += cut.kerf;
    rest = { from: cut.at + cut.kerf, to: rest.to };
  }
  if (rest.to > rest.from) pieces.push(rest);
  const total = pieces.reduce((sum, piece) => sum + piece.to - piece.from, dust);
  if (total !== whole) faults.push(`${name}: pieces and dust make ${total}, not ${whole}`);
  const has = (from: number, length: number) =>
    pieces.some((piece) => piece.from === from && piece.to === from + length);
  for (const { item, x, length } of bar.placements)
    if (!has(x, length)) faults.push(`${name}: item ${item} at ${x} does not come off the saw`);
  for (const { x, length } of bar.offcuts) {
    if (!has(x, length)) faults.push(`${name}: the offcut at ${x} does not come off the saw`);
    if (length <= job.kerf) faults.push(`${name}: the offcut at ${x} is dust`);
  }
  return faults;
}

function inPlace(job: BarJob, bar: BarSheet, name: string): string[] {
  const faults: string[] = [];
  const stock = job.stock[bar.stock];
  if (!stock) return [`${name}: no such stock`];
  if (bar.placements.length === 0) faults.push(`${name}: nothing is cut from it`);
  let free = job.trim.start;
  for (const { item, x, length } of [...bar.placements].sort((a, b) => a.x - b.x)) {
    if (length !== job.items[item]?.length) faults.push(`${name}: item ${item} is ${length} long`);
    if (x < free) faults.push(`${name}: item ${item} at ${x} begins before ${free}`);
    if (x + length > stock.length - job.trim.end)
      faults.push(`${name}: item ${item} at ${x} runs over the end`);
    free = x + length + job.kerf;
  }
  return faults;
}

function counted(job: BarJob, answer: BarAnswer): string[] {
  const faults: string[] = [];
  job.items.forEach(({ quantity }, item) => {
    const cut = answer.bars.flatMap((b) => b.placements).filter((p) => p.item === item).length;
    const out = answer.leftOut.filter((l) => l.item === item);
    const left = out.reduce((sum, l) => sum + l.quantity, 0);
    if (cut + left !== quantity)
      faults.push(`item ${item}: ${cut} cut and ${left} left out of ${quantity}`);
  });
  job.stock.forEach(({ quantity }, stock) => {
    const used = answer.bars.filter((bar) => bar.stock === stock).length;
    if (quantity !== null && used > quantity)
      faults.push(`stock ${stock}: ${used} used, there are ${quantity}`);
  });
  for (const { item, because } of answer.leftOut) {
    const length = job.items[item]?.length ?? 0;
    const goes = job.stock.some(
      (s) => s.quantity !== 0 && length <= s.length - job.trim.start - job.trim.end,
    );
    if (because === 'too-long' && goes) faults.push(`item ${item} is not too long`);
  }
  return faults;
}

function priced(job: BarJob, answer: BarAnswer): string[] {
  const each = (stock: number): number => {
    const bar = job.stock[stock];
    if (answer.measure === 'bars') return 1;
    return (answer.measure === 'length' ? bar?.length : bar?.cost) ?? 0;
  };
  const cost = answer.bars.reduce((sum, bar) => sum + each(bar.stock), 0);
  const faults: string[] = [];
  if (cost !== answer.cost) faults.push(`the bars cost ${cost}, not ${answer.cost}`);
  if (answer.lowerBound > answer.cost) faults.push('the bound is above the cost');
  if (answer.proven && answer.lowerBound !== answer.cost) faults.push('proven without a bound');
  return faults;
}

/** Every way in which an answer is wrong, in words; none when it can be sawn as it says. Shares no code with the solver. */
export function verifyBars(job: BarJob, answer: BarAnswer): string[] {
  return [
    ...answer.bars.flatMap((bar, i) => [
      ...inPlace(job, bar, `bar ${i + 1}`),
      ...replay(job, bar, `bar ${i + 1}`),
    ]),
    ...counted(job, answer),
    ...priced(job, answer),
  ];
}
