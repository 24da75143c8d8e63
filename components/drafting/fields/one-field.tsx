import { useState } from 'react';
import { View } from 'react-native';
import { Checkbox } from '../../ui/checkbox';
import { Row } from '../../ui/layout';
import { Select } from '../../ui/select';
import { Tag } from '../../ui/tag';
import { Text } from '../../ui/text';
import { TextField } from '../../ui/text-field';
import { LimitedField } from './limited-field';
import { type Change, type ListField, type TextLike } from './list-field';

export interface OneFieldProps<T> {
  field: ListField<T>;
  item: T;
  onChange: Change<T>;
}

/** One field of an element, as its kind asks. */
export function OneField<T>({ field, item, onChange }: OneFieldProps<T>) {
  if ('draw' in field) return field.draw(item, onChange);
  const value = field.get(item);
  const put = (text: string) => onChange((now) => field.set(now, text));
  if (field.flag)
    return (
      <Checkbox
        label={field.label}
        help={field.help}
        value={value === 'yes'}
        onChange={(on) => put(on ? 'yes' : 'no')}
      />
    );
  if (field.many) return <Several field={field} many={field.many} value={value} put={put} />;
  if (field.options)
    return (
      <Select
        label={field.label}
        help={field.help}
        options={field.options}
        value={value}
        onChange={put}
        error={field.fault?.(value, item)}
      />
    );
  if (field.lazy)
    return <LazyField key={value} field={field} item={item} start={value} put={put} />;
  return (
    <LimitedField
      label={field.label}
      help={field.help}
      value={value}
      onChange={put}
      error={field.fault?.(value, item)}
      mono={field.mono}
      most={field.most ?? Infinity}
    />
  );
}

interface SeveralProps<T> {
  field: TextLike<T>;
  many: NonNullable<TextLike<T>['many']>;
  value: string;
  put: (text: string) => void;
}

/** Any of a few, as tags that are on or off. */
function Several<T>({ field, many, value, put }: SeveralProps<T>) {
  const on = new Set(value.split(' ').filter(Boolean));
  const turn = (one: string) => {
    if (on.has(one)) on.delete(one);
    else on.add(one);
    put([...on].join(' '));
  };
  if (many.length === 0) return null;
  return (
    <View role="group" aria-label={field.label} style={{ gap: 6 }}>
      <Text size="note" weight={600}>
        {field.label}
      </Text>
      <Row gap={8} wrap>
        {many.map((option) => (
          <Tag
            key={option.value}
            label={option.label}
            kind={on.has(option.value) ? 'on' : 'plain'}
            onPress={() => turn(option.value)}
          />
        ))}
      </Row>
    </View>
  );
}

interface LazyFieldProps<T> {
  field: TextLike<T>;
  item: T;
  start: string;
  put: (text: string) => void;
}

/** Typed to its end before it takes effect. */
function LazyField<T>({ field, item, start, put }: LazyFieldProps<T>) {
  const [text, setText] = useState(start);
  const fault = field.fault?.(text, item);
  const keep = () => {
    if (!fault && text !== start) put(text);
  };
  return (
    <TextField
      label={field.label}
      help={field.help}
      value={text}
      onChange={setText}
      onBlur={keep}
      onEnter={keep}
      error={fault}
      mono={field.mono}
    />
  );
}
