import { type Part, type Stock } from '../../plan/document';
import { type PlanModel } from '../../plan/model';
import { cutList } from './cut-list';
import { stavesOf } from './staves';
import {
  type CutRow,
  type JobPiece,
  type JobStock,
  type ShopSettings,
  type StockJob,
} from './types';

/** Two thicknesses are one stock within this, mm. Common practice, no source. */
const sameThickness = 0.75;
const slack = 1e-6;

const lengthOf = (model: PlanModel, text: string): number | null =>
  text.trim() === '' ? null : (model.evaluate(text).value?.x ?? null);

/** What of the shop goes for a stock: the same form, and its thickness, or, where either is not known, its name. */
function ownStock(model: PlanModel, stock: Stock, settings: ShopSettings): JobStock[] {
  const thickness = lengthOf(model, stock.thickness);
  return (settings.own ?? [])
    .filter((own) => {
      if (own.form !== stock.form || own.quantity <= 0) return false;
      return own.thickness === null || thickness === null
        ? own.name.trim().toLowerCase() === stock.name.trim().toLowerCase()
        : Math.abs(own.thickness - thickness) <= sameThickness;
    })
    .map((own) => ({
      id: own.id,
      source: 'shop' as const,
      name: own.name,
      length: own.length,
      width: own.width,
      quantity: own.quantity,
      price: 0,
    }));
}

function saleStock(model: PlanModel, stock: Stock, settings: ShopSettings): JobStock[] {
  const without = new Set(settings.without ?? []);
  const given = stock.sizes.flatMap((size) => {
    const length = lengthOf(model, size.length);
    const width = lengthOf(model, size.width);
    return length === null ? [] : [{ id: size.id, length, width, price: size.price ?? null }];
  });
  return [...given, ...(settings.sizes?.[stock.id] ?? [])]
    .filter((size) => !without.has(size.id))
    .map((size) => ({
      ...size,
      source: 'sale' as const,
      name: stock.name,
      quantity: null,
      price: settings.prices?.[size.id] ?? size.price,
    }));
}

/** The stocks a part is made of: its own once, or one for each layer of a lamination, by the thickness that names the layer. */
function stocksOf(part: Part, stocks: readonly Stock[]): string[] {
  const own = part.stockId ?? '';
  if (part.layers.length === 0 || part.thickness.trim() !== '') return [own];
  return part.layers.map((layer) => stocks.find((s) => s.thickness.trim() === layer)?.id ?? own);
}

function pieceOf(row: CutRow, stock: Stock, anyWay: boolean, times: number): JobPiece | null {
  const length = row.rough?.length ?? row.length;
  const width = row.rough?.width ?? row.width ?? (stock.form === 'rod' ? 0 : null);
  if (length === null || width === null) return null;
  const solid = stock.form !== 'sheet';
  const keeps = !anyWay && (solid || (stock.grained && row.grain !== 'free'));
  const across = keeps && row.grain === 'width';
  return {
    partId: row.partId,
    mark: row.mark,
    name: row.name,
    role: row.role,
    length: across ? width : length,
    width: across ? length : width,
    quantity: row.quantity * times,
    turn: !keeps,
    staves: 1,
  };
}

/** Boards of which every part takes the whole width are a matter of lengths alone, as strips and rod are. */
function kindOf(stock: Stock, sizes: readonly JobStock[], pieces: readonly JobPiece[]) {
  if (stock.form === 'sheet') return 'sheets' as const;
  if (stock.form !== 'board') return 'bars' as const;
  const widths = sizes.map((size) => size.width ?? 0);
  const whole = pieces.every((p) => widths.every((w) => w === 0 || Math.abs(p.width - w) <= 0.5));
  return whole ? ('bars' as const) : ('sheets' as const);
}

function kerfOf(model: PlanModel, stock: Stock, settings: ShopSettings): number {
  return Math.max(0, settings.kerf ?? lengthOf(model, stock.kerf) ?? 3);
}

function jobOf(model: PlanModel, stock: Stock, rows: CutRow[], settings: ShopSettings): StockJob {
  const sizes = [...ownStock(model, stock, settings), ...saleStock(model, stock, settings)];
  const faults: string[] = [];
  const anyWay = settings.anyWay?.includes(stock.id) ?? false;
  const widest = sizes.reduce<number | null>((w, s) => Math.max(w ?? 0, s.width ?? 0), null);
  const pieces = model.document.parts.flatMap((part): JobPiece[] => {
    const times = stocksOf(part, model.document.stock).filter((id) => id === stock.id).length;
    const row = rows.find((r) => r.partId === part.id);
    if (times === 0 || !row) return [];
    if (row.fault) faults.push(row.fault);
    const piece = row.fault ? null : pieceOf(row, stock, anyWay, times);
    if (!piece) return [];
    return [stock.form === 'board' ? stavesOf(piece, widest, settings.stave) : piece];
  });
  if (sizes.length === 0 && pieces.length > 0)
    faults.push(`No size of ${stock.name} is on sale in this plan; give one you can get.`);
  return {
    stockId: stock.id,
    name: stock.name,
    form: stock.form,
    kind: kindOf(stock, sizes, pieces),
    grained: stock.grained || stock.form !== 'sheet',
    kerf: kerfOf(model, stock, settings),
    trim: Math.max(0, settings.trim ?? 0),
    stock: sizes,
    pieces: pieces.filter((p) => p.length > slack && (p.width > slack || stock.form === 'rod')),
    faults,
  };
}

/**
 * What to cut from each stock of a plan, on the sizes and with the kerf the person has: parts, spares, test pieces and
 * helpers, with their allowances. A part whose size does not come out is named in `faults`; the rest goes on.
 */
export function stockJobs(model: PlanModel, settings: ShopSettings = {}): StockJob[] {
  const rows = cutList(model);
  return model.document.stock
    .map((stock) => jobOf(model, stock, rows, settings))
    .filter((job) => job.pieces.length > 0 || job.faults.length > 0);
}

/** Parts that name no stock, or one that is not in the plan: nothing can be laid out for them. */
export function partsWithoutStock(model: PlanModel): CutRow[] {
  const known = new Set(model.document.stock.map((s) => s.id));
  return cutList(model).filter((row) => row.stockId === null || !known.has(row.stockId));
}
