import { useState } from 'react';
import { TextArea, TextField, type TextFieldProps } from '../../ui/text-field';

export interface LimitedFieldProps extends Omit<TextFieldProps, 'ref'> {
  /** The longest text that is kept, in characters. */
  most: number;
  /** Several lines. */
  area?: boolean;
}

/** A text that has a longest length: what is over stays out, and the field says so. */
export function LimitedField({ most, area, onChange, error, ...rest }: LimitedFieldProps) {
  const [over, setOver] = useState(0);
  const put = (text: string) => {
    setOver(Math.max(0, text.length - most));
    onChange(text.slice(0, most));
  };
  const said =
    over > 0
      ? `At most ${most} characters fit here; the last ${over} were left out. Shorten it and put them in again.`
      : error;
  return area ? (
    <TextArea {...rest} lines={2} onChange={put} error={said} />
  ) : (
    <TextField {...rest} onChange={put} error={said} />
  );
}
