import { type Change } from '../compare';
import { type Kind, type Sense } from '../document';

/**
 * What a change means at one bench, the worst first.
 * `cannot` what is cut cannot be saved: make it again · `make` new, and its step is past · `missed` a new step or caution
 * before where the builder is · `recut` cut it again, a saw's width or more comes off · `work` a pass, a stroke, a new
 * setting · `done` done by the old words: read it again · `measure` cut, but nobody knows to what size · `inside` cut, and
 * inside the new tolerance · `not-needed` made, and no longer part of it · `nothing-cut` reached, nothing cut yet ·
 * `not-reached`.
 */
export const meanings = [
  'cannot',
  'make',
  'missed',
  'recut',
  'work',
  'measure',
  'done',
  'inside',
  'not-needed',
  'nothing-cut',
  'not-reached',
] as const;
export type Meaning = (typeof meanings)[number];

/** Stock that a part made again takes; mm, its allowance included; null where a size cannot be worked out. */
export interface StockNeed {
  partId: string;
  mark: string;
  quantity: number;
  stockId: string | null;
  stock: string;
  length: number | null;
  width: number | null;
  thickness: number | null;
}

/** A figure that is cut, against the new band. Base units. */
export interface CutFigure {
  /** `value`, `length`, `width`, `thickness`. */
  of: string;
  /** As made: read, or by the old figure when nobody measured. */
  made: number;
  read: boolean;
  low: number;
  high: number;
  /** Signed: above 0 it is over by so much, below 0 under; 0 inside. */
  off: number;
  sense: Sense;
  kind: Kind;
}

export interface NoticeItem {
  change: Change;
  means: Meaning;
  /** How to work it: a pass, a move, a new setting. */
  cure: 'none' | 'work' | 'move' | 'set';
  figures: CutFigure[];
  needs: StockNeed[];
  /** Judged by the old figure: nothing was read. */
  assumed: boolean;
}

/** What a new revision means for one bench copy. Empty items: nothing for this builder. */
export interface Notice {
  items: NoticeItem[];
  /** How many items of each meaning; only those there are. */
  counts: Partial<Record<Meaning, number>>;
  /** The worst of them; null when there is nothing. */
  worst: Meaning | null;
}
