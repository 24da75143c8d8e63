import { parseExpression, parseLength } from '../../../shared/measure';
import { limits } from '../../../shared/api/limits';
import { type PlanDocument } from '../../../shared/plan/document';
import { type TextLike } from './list-field';

/** A word of the plan's file as it is said: `table-saw` is a table saw. */
export const said = (value: string) => value.replace(/-/g, ' ');
export const options = (values: readonly string[]) =>
  values.map((value) => ({ value, label: said(value) }));

const long: Record<string, number> = {
  where: limits.note,
  why: limits.note,
  how: limits.note,
  note: limits.note,
  instead: limits.note,
  text: limits.note,
  exitCover: limits.note,
  exitStop: limits.note,
  guardInstead: limits.note,
  expression: limits.expression,
  url: limits.url,
  symbol: limits.symbol,
  mark: 4,
};
/** The most characters a field of an element holds. */
export const mostOf = (key: string): number => long[key] ?? limits.name;

/** A text field of an element. */
export function text<T, K extends keyof T & string>(
  key: K,
  label: string,
  more: Partial<TextLike<T>> = {},
): TextLike<T> {
  return {
    key,
    label,
    get: (item) => String(item[key] ?? ''),
    set: (item, value) => ({ ...item, [key]: value }),
    most: mostOf(key),
    ...more,
  };
}

/** One of a few. */
export const choice = <T, K extends keyof T & string>(
  key: K,
  label: string,
  values: readonly string[],
  more: Partial<TextLike<T>> = {},
) => text<T, K>(key, label, { options: options(values), ...more });

/** Any of a few. */
export const several = <T, K extends keyof T & string>(
  key: K,
  label: string,
  many: readonly { value: string; label: string }[],
): TextLike<T> => ({
  key,
  label,
  many,
  get: (item) => (item[key] as readonly string[]).join(' '),
  set: (item, value) => ({ ...item, [key]: value.split(' ').filter(Boolean) }),
});

/** Yes or no. */
export const flag = <T, K extends keyof T & string>(
  key: K,
  label: string,
  help?: string,
): TextLike<T> => ({
  key,
  label,
  help,
  flag: true,
  get: (item) => (item[key] ? 'yes' : 'no'),
  set: (item, value) => ({ ...item, [key]: value === 'yes' }),
});

/** Yes, no, or not said. */
export const maybe = <T, K extends keyof T & string>(key: K, label: string): TextLike<T> => ({
  key,
  label,
  options: [
    { value: 'unsaid', label: 'not said' },
    { value: 'yes', label: 'yes' },
    { value: 'no', label: 'no' },
  ],
  get: (item) => (item[key] === undefined ? 'unsaid' : item[key] ? 'yes' : 'no'),
  set: (item, value) => ({ ...item, [key]: value === 'unsaid' ? undefined : value === 'yes' }),
});

/** An element of the plan by id, or none. */
export const one = <T, K extends keyof T & string>(
  key: K,
  label: string,
  list: readonly { value: string; label: string }[],
): TextLike<T> => ({
  key,
  label,
  options: [{ value: 'none', label: 'not said' }, ...list],
  get: (item) => String(item[key] ?? 'none'),
  set: (item, value) => ({ ...item, [key]: value === 'none' ? undefined : value }),
});

/** A whole number of at least one; typed to its end before it counts. */
export const whole = <T, K extends keyof T & string>(key: K, label: string, most = 9999) =>
  text<T, K>(key, label, {
    lazy: true,
    set: (item, value) => ({ ...item, [key]: Number(value) }),
    fault: (value) =>
      /^[1-9]\d{0,3}$/.test(value.trim()) && Number(value) <= most
        ? undefined
        : `A whole number from 1 to ${most}.`,
  });

/** A number that may be left out; typed to its end before it counts. */
export const amount = <T, K extends keyof T & string>(key: K, label: string, most: number) =>
  text<T, K>(key, label, {
    lazy: true,
    set: (item, value) => ({
      ...item,
      [key]: value.trim() === '' ? undefined : Number(value.trim().replace(',', '.')),
    }),
    fault: (value) => {
      const number = Number(value.trim().replace(',', '.'));
      return value.trim() === '' || (number >= 0 && number <= most)
        ? undefined
        : `A number from 0 to ${most}, or nothing.`;
    },
  });

const address = /^https?:\/\/[^\s/]+\.[^\s]+$/;
/** The address of a page. */
export const addressField = <T, K extends keyof T & string>(
  key: K,
  label: string,
  empty: boolean,
) =>
  text<T, K>(key, label, {
    lazy: true,
    fault: (v) =>
      (empty && v === '') || address.test(v) ? undefined : 'An address begins with https://',
  });

/** A figure alone takes the plan's unit; anything else is an expression. */
export const expressionFault = (document: PlanDocument) => (value: string) => {
  if (value.trim() === '') return 'Give a figure or an expression.';
  const figure = parseLength(value, { unit: document.units });
  if (figure.ok) return undefined;
  if (/^[\d\s./'"-]+(?:mm|in|ft|cm|m)?$/.test(value))
    return `Column ${figure.at + 1}: ${figure.message} ${figure.cure ?? ''}`.trim();
  const parsed = parseExpression(value);
  return parsed.ok
    ? undefined
    : `Column ${parsed.fault.at + 1}: ${parsed.fault.message} ${parsed.fault.cure ?? ''}`.trim();
};
const optionalFault = (document: PlanDocument) => (value: string) =>
  value.trim() === '' ? undefined : expressionFault(document)(value);

/** A figure or an expression of the plan's dimensions. */
export const measured = <T, K extends keyof T & string>(
  document: PlanDocument,
  key: K,
  label: string,
  more: Partial<TextLike<T>> & { needed?: boolean } = {},
) => {
  const { needed, ...rest } = more;
  return text<T, K>(key, label, {
    mono: true,
    most: limits.expression,
    fault: (needed ? expressionFault : optionalFault)(document),
    ...rest,
  });
};
