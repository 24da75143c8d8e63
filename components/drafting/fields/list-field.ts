import { type ReactNode } from 'react';

/** Changes an element as it stands when the change is made. */
export type Change<T> = (change: (item: T) => T) => void;

/** One field of an element: how it is read, put back, and judged. */
export interface TextLike<T> {
  key: string;
  label: string;
  get: (item: T) => string;
  set: (item: T, text: string) => T;
  options?: readonly { value: string; label: string }[];
  /** Any of these; `get` and `set` have them joined by spaces. */
  many?: readonly { value: string; label: string }[];
  /** What is wrong with the text, in a sentence. */
  fault?: (text: string, item: T) => string | undefined;
  flag?: boolean;
  mono?: boolean;
  /** The longest text, in characters. */
  most?: number;
  /** Put only when the field is left or Enter is pressed, and only without a fault. */
  lazy?: boolean;
  help?: string;
}

/** A field that draws itself: a list inside an element. */
export interface Drawn<T> {
  key: string;
  draw: (item: T, change: Change<T>) => ReactNode;
}

export type ListField<T> = TextLike<T> | Drawn<T>;

/** Fields of one shape of a union as fields of the whole. */
export function fieldsOf<A, B extends A>(
  is: (item: A) => item is B,
  fields: readonly ListField<B>[],
): ListField<A>[] {
  return fields.map((field): ListField<A> => {
    if ('draw' in field)
      return {
        key: field.key,
        draw: (item, change) =>
          is(item) ? field.draw(item, (fn) => change((a) => (is(a) ? fn(a) : a))) : null,
      };
    const { fault } = field;
    return {
      ...field,
      get: (item) => (is(item) ? field.get(item) : ''),
      set: (item, text) => (is(item) ? field.set(item, text) : item),
      fault: fault ? (text, item) => (is(item) ? fault(text, item) : undefined) : undefined,
    };
  });
}

/** How elements of a list are named, made and edited. */
export interface ListFields<T> {
  /** A new element, or several kinds to choose from. */
  make: Maker<T> | readonly { label: string; make: Maker<T> }[];
  /** Its line while it is closed. */
  name: (item: T) => string;
  fields: readonly ListField<T>[] | ((item: T) => readonly ListField<T>[]);
}
type Maker<T> = (id: string, count: number) => T;
