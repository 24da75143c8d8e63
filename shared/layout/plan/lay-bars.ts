import {
  type BarAnswer,
  type BarJob,
  type BarOptions,
  solveBars,
  toMm,
  unitsDown,
  unitsUp,
} from '../bars';
import { type LaidSheet, type LaidStock, type StockJob } from './types';

const wide = (job: StockJob, stock: number): number =>
  job.stock[stock]?.width ?? Math.max(1, ...job.pieces.map((p) => p.width));

/** Pieces too wide for every bar cannot be cut from them whatever their length. */
const tooWide = (job: StockJob, piece: number): boolean => {
  const width = job.pieces[piece]?.width ?? 0;
  return job.stock.every((s) => s.width !== null && width > s.width + 0.01);
};

/** Prices count where every size on sale has one; else the pieces to buy, or their length where they differ. */
export function pricesOf(job: StockJob): {
  measure: LaidStock['measure'];
  costs: (number | undefined)[];
} {
  const sale = job.stock.filter((s) => s.source === 'sale');
  const priced = sale.length > 0 && sale.every((s) => s.price !== null && s.price > 0);
  if (priced)
    return {
      measure: 'price',
      costs: job.stock.map((s) => (s.source === 'shop' ? 0 : Math.round((s.price ?? 0) * 100))),
    };
  const one = new Set(sale.map((s) => `${s.length}×${s.width ?? 0}`)).size <= 1;
  const size = (length: number, width: number | null) =>
    Math.round(length * (job.kind === 'sheets' ? (width ?? 1) : 1));
  return {
    measure: one ? 'pieces' : 'size',
    costs: job.stock.map((s) => (s.source === 'shop' ? 0 : one ? 1 : size(s.length, s.width))),
  };
}

function barJob(job: StockJob): { bars: BarJob; measure: LaidStock['measure'] } {
  const { measure, costs } = pricesOf(job);
  return {
    measure,
    bars: {
      kerf: unitsUp(job.kerf),
      trim: { start: unitsUp(job.trim), end: unitsUp(job.trim) },
      stock: job.stock.map(({ length, quantity }, i) => ({
        length: unitsDown(length),
        quantity,
        cost: costs[i] ?? 1,
      })),
      items: job.pieces.map(({ length, quantity }, i) => ({
        length: unitsUp(length),
        quantity: tooWide(job, i) ? 0 : quantity,
      })),
    },
  };
}

function sheetOf(job: StockJob, bar: BarAnswer['bars'][number]): LaidSheet {
  const height = wide(job, bar.stock);
  const whole = job.stock[bar.stock]?.length ?? 1;
  const placements = bar.placements.map(({ item, x, length }) => ({
    piece: item,
    x: toMm(x),
    y: 0,
    w: toMm(length),
    h: Math.min(height, job.pieces[item]?.width || height),
    turned: false,
  }));
  return {
    stock: bar.stock,
    placements,
    cuts: bar.cuts.map((cut) => ({
      n: cut.n,
      kind: 'crosscut' as const,
      from: { x: toMm(cut.at), y: 0 },
      to: { x: toMm(cut.at), y: height },
      setting: toMm(cut.setting),
      same: cut.same,
      purpose: cut.kind === 'part' ? ('part' as const) : ('trim' as const),
      frees: cut.frees === null ? [] : [cut.frees],
    })),
    offcuts: bar.offcuts.map(({ x, length }) => ({ x: toMm(x), y: 0, w: toMm(length), h: height })),
    used: placements.reduce((sum, p) => sum + p.w, 0) / whole,
  };
}

/** Boards, strips or rod of one stock, laid out. */
export function layBars(
  job: StockJob,
  options: Omit<BarOptions, 'onBetter'> & { onBetter?: (laid: LaidStock) => void } = {},
): LaidStock {
  const { bars, measure } = barJob(job);
  const laid = (answer: BarAnswer): LaidStock => ({
    stockId: job.stockId,
    sheets: answer.bars.map((bar) => sheetOf(job, bar)),
    measure,
    cost: answer.cost,
    lowerBound: answer.lowerBound,
    proven: answer.proven,
    leftOut: [
      ...answer.leftOut.map(({ item, quantity, because }) => ({
        piece: item,
        quantity,
        because: because === 'too-long' ? ('too-big' as const) : because,
      })),
      ...job.pieces.flatMap(({ quantity }, piece) =>
        tooWide(job, piece) ? [{ piece, quantity, because: 'too-big' as const }] : [],
      ),
    ],
  });
  const { onBetter, ...rest } = options;
  return laid(
    solveBars(bars, { ...rest, ...(onBetter ? { onBetter: (a) => onBetter(laid(a)) } : {}) }),
  );
}
