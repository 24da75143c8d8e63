import { type Consumable, type Hardware, type Stock } from '../../plan/document';
import { type PlanModel } from '../../plan/model';
import { type LaidStock, type StockJob } from '../plan/types';
import { boardFeetOf } from './board-feet';
import { type Coverage, surfaceOf, tinsFor } from './coverage';
import { cheapestPacks, type Pack } from './packs';

/** What the person changed in the list: prices and pack sizes by the id of the line, what the label covers. */
export interface BuyingSettings {
  /** By line id; of one piece, pack or tin. */
  prices?: Readonly<Record<string, number>>;
  packs?: Readonly<Record<string, readonly Pack[]>>;
  coverage?: Readonly<Record<string, Coverage>>;
  /** Already in the shop, by line id: how many are taken off. */
  have?: Readonly<Record<string, number>>;
}

export interface BuyingLine {
  id: string;
  group: 'stock' | 'hardware' | 'consumables';
  name: string;
  /** What is bought, e.g. sheets of 2440 × 1220: sizes in mm for stock, packs for hardware. */
  size: { length: number; width: number | null } | null;
  packs: { of: number; count: number; price: number | null }[];
  /** What the plan takes, and what is in the shop already. */
  needed: number;
  have: number;
  /** Pieces, packs or tins to buy; null when it is not known. */
  buy: number | null;
  each: number | null;
  total: number | null;
  /** Boards alone. */
  boardFeet: number | null;
  note: string;
}

export interface BuyingList {
  lines: BuyingLine[];
  /** Of the lines with a price. */
  total: number;
  /** Lines to buy that have none. */
  withoutPrice: number;
  /** Surface of the parts, m², that finishes are worked out from. */
  surface: number;
}

const blank = { size: null, packs: [], boardFeet: null, note: '', have: 0 };

function stockLines(
  stock: Stock,
  thickness: number | null,
  job: StockJob,
  laid: LaidStock,
  prices: BuyingSettings['prices'],
): BuyingLine[] {
  return job.stock.flatMap((size, at): BuyingLine[] => {
    const used = laid.sheets.filter((sheet) => sheet.stock === at).length;
    if (used === 0) return [];
    const shop = size.source === 'shop';
    const each = shop ? null : (prices?.[size.id] ?? size.price);
    const feet =
      stock.form === 'board' && thickness !== null && size.width !== null
        ? boardFeetOf(thickness, size.width, size.length) * used
        : null;
    return [
      {
        ...blank,
        id: size.id,
        group: 'stock',
        name: size.name,
        size: { length: size.length, width: size.width },
        needed: used,
        have: shop ? used : 0,
        buy: shop ? 0 : used,
        each,
        total: shop ? 0 : each === null ? null : each * used,
        boardFeet: feet,
        note: shop ? 'from the shop' : '',
      },
    ];
  });
}

function hardwareLine(item: Hardware, settings: BuyingSettings): BuyingLine {
  const have = Math.min(item.quantity, settings.have?.[item.id] ?? 0);
  const need = item.quantity - have;
  const price = settings.prices?.[item.id] ?? item.price ?? null;
  const packs = settings.packs?.[item.id] ?? [{ of: item.packOf ?? 1, price }];
  const choice = cheapestPacks(packs, need);
  const bought = (choice?.counts ?? []).flatMap((count, i) => {
    const pack = packs[i];
    return pack && count > 0 ? [{ of: pack.of, count, price: pack.price }] : [];
  });
  return {
    ...blank,
    id: item.id,
    group: 'hardware',
    name: item.name,
    packs: bought,
    needed: item.quantity,
    have,
    buy: bought.reduce((sum, pack) => sum + pack.count, 0),
    each: packs.length === 1 ? (packs[0]?.price ?? null) : null,
    total: choice?.price ?? (need === 0 ? 0 : null),
    note: choice && choice.pieces > need ? `${choice.pieces - need} over` : '',
  };
}

function consumableLine(item: Consumable, surface: number, settings: BuyingSettings): BuyingLine {
  const coverage = settings.coverage?.[item.id];
  const tins = coverage ? tinsFor(surface, coverage) : null;
  const have = settings.have?.[item.id] ?? 0;
  const buy = tins === null ? (have > 0 ? 0 : 1) : Math.max(0, tins - have);
  const each = settings.prices?.[item.id] ?? null;
  return {
    ...blank,
    id: item.id,
    group: 'consumables',
    name: item.name,
    needed: tins ?? 1,
    have,
    buy,
    each,
    total: buy === 0 ? 0 : each === null ? null : each * buy,
    note: item.amount,
  };
}

/**
 * What to buy for a plan as it was laid out: stock, hardware in the cheapest packs, consumables by what their label says they
 * cover. What is in the shop is taken off.
 */
export function buyingList(
  model: PlanModel,
  laid: readonly { job: StockJob; laid: LaidStock }[],
  settings: BuyingSettings = {},
): BuyingList {
  const surface = surfaceOf(model);
  const { document } = model;
  const lines = [
    ...laid.flatMap((entry) => {
      const stock = document.stock.find((s) => s.id === entry.job.stockId);
      if (!stock) return [];
      const thickness = model.evaluate(stock.thickness).value?.x ?? null;
      return stockLines(stock, thickness, entry.job, entry.laid, settings.prices);
    }),
    ...document.hardware.map((item) => hardwareLine(item, settings)),
    ...document.consumables.map((item) => consumableLine(item, surface, settings)),
  ];
  const open = lines.filter((line) => line.total === null && line.buy !== 0);
  return {
    lines,
    total: lines.reduce((sum, line) => sum + (line.total ?? 0), 0),
    withoutPrice: open.length,
    surface,
  };
}
