import { useState } from 'react';
import { TextField } from '../ui/text-field';

export interface NumberFieldProps {
  label: string;
  value: number;
  onChange: (value: number) => void;
  /** Only whole numbers of at least this. */
  wholeFrom?: number;
  help?: string;
}

/** A number typed to its end: `1.` on the way to `1.5` is left alone, and only a number takes effect. */
export function NumberField({ label, value, onChange, wholeFrom, help }: NumberFieldProps) {
  const [text, setText] = useState<string | null>(null);
  const shown = text ?? String(value);
  const number = Number(shown.trim().replace(',', '.'));
  const bad =
    shown.trim() === '' ||
    !Number.isFinite(number) ||
    number < (wholeFrom ?? 0) ||
    (wholeFrom !== undefined && !Number.isInteger(number));
  const put = (next: string) => {
    setText(next);
    const n = Number(next.trim().replace(',', '.'));
    const fits =
      next.trim() !== '' &&
      Number.isFinite(n) &&
      n >= (wholeFrom ?? 0) &&
      (wholeFrom === undefined || Number.isInteger(n));
    if (fits && n !== value) onChange(n);
  };
  return (
    <TextField
      label={label}
      inputMode="decimal"
      value={shown}
      onChange={put}
      onBlur={() => {
        if (!bad) setText(null);
      }}
      help={help}
      error={
        bad
          ? `A number${wholeFrom === undefined ? '' : `, whole, from ${wholeFrom}`}. ${value} counts until then.`
          : undefined
      }
    />
  );
}
