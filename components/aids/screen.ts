import { type ReactNode } from 'react';
import { type z } from 'zod';
import { type ShopCard } from '../../shared/api/bench';
import { type Aid, type AnyAid } from '../../shared/aids/aid';
import { type Refused } from '../../shared/aids/outcome';
import { type FigureParts } from '../ui/figure';
import { type VerdictKind } from '../ui/verdict';
import { type AidPart, type Units, type Values } from './form-values';
import { type Show } from './show';

export interface AidRow {
  label: string;
  figure: FigureParts | string;
  note?: string;
  /** A length in mm that can be handed on to a plan's dimension. */
  mm?: number;
}

/** What a screen says of a result: the action first, then why, then the figures. */
export interface AidSays {
  kind: VerdictKind;
  say: string;
  why?: string;
  rows: readonly AidRow[];
}

export interface DrawingProps<I, R> {
  input: I;
  result: R;
  show: Show;
}

/** What a screen can take from the shop card; null when the card has nothing of it. */
export interface FromCard {
  label: string;
  take: (card: ShopCard) => Values | null;
}

export interface ScreenOf<S extends z.ZodType, R> {
  aid: Aid<S, R>;
  /** The fields for what stands in them now. */
  parts: (values: Values, units: Units) => readonly AidPart[];
  /** What stands in them first. */
  start: Readonly<Record<Units, Values>>;
  fromCard?: FromCard;
  says: (props: DrawingProps<z.output<S>, R>) => AidSays;
  drawing: (props: DrawingProps<z.output<S>, R>) => ReactNode;
}

/** A result with what is said and drawn of it, or the refusal. */
export type Worked = Refused | { ok: true; says: AidSays; drawing: ReactNode };

/** A screen without its types, for the frame. */
export interface AnyScreen {
  aid: AnyAid;
  parts: (values: Values, units: Units) => readonly AidPart[];
  start: Readonly<Record<Units, Values>>;
  fromCard?: FromCard;
  work: (input: unknown, show: Show) => Worked;
}

export function defineScreen<S extends z.ZodType, R>(screen: ScreenOf<S, R>): AnyScreen {
  const { aid, parts, start, fromCard, says, drawing } = screen;
  return {
    aid,
    fromCard,
    parts,
    start,
    work: (raw, show) => {
      const outcome = aid.run(raw);
      if (!outcome.ok) return outcome;
      const props = { input: aid.input.parse(raw), result: outcome.result, show };
      return { ok: true, says: says(props), drawing: drawing(props) };
    },
  };
}
