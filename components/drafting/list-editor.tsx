import { useState, type ReactNode } from 'react';
import { View } from 'react-native';
import { v7 as uuid } from 'uuid';
import { Button } from '../ui/button';
import { Checkbox } from '../ui/checkbox';
import { Heading } from '../ui/heading';
import { Row, Rule, Section, Stack } from '../ui/layout';
import { Select } from '../ui/select';
import { Text } from '../ui/text';
import { TextField } from '../ui/text-field';

/** One field of a row: how it is read from the element, put back, and judged. */
export interface ListField<T> {
  key: string;
  label: string;
  get: (item: T) => string;
  set: (item: T, text: string) => T;
  options?: readonly { value: string; label: string }[];
  /** What is wrong with the text, in a sentence. */
  fault?: (text: string, item: T) => string | undefined;
  flag?: boolean;
  mono?: boolean;
  /** Put only when the field is left or Enter is pressed, and only without a fault. */
  lazy?: boolean;
  help?: string;
}

export interface ListFields<T> {
  /** A new element. */
  make: (id: string, count: number) => T;
  /** Its line while it is closed. */
  name: (item: T) => string;
  fields: readonly ListField<T>[];
}

export interface ListEditorProps<T extends { id: string }> {
  title: string;
  fields: ListFields<T>;
  items: readonly T[];
  onChange: (items: T[]) => void;
  /** The element that is open at first, when something leads to it. */
  start?: string | null;
  /** What stands under a line, closed or open. */
  below?: (item: T) => ReactNode;
}

/** A list of a plan: lines that open into their fields. */
export function ListEditor<T extends { id: string }>({
  title,
  fields,
  items,
  onChange,
  start = null,
  below,
}: ListEditorProps<T>) {
  const [open, setOpen] = useState<string | null>(start);
  const replace = (next: T) => onChange(items.map((item) => (item.id === next.id ? next : item)));
  const add = () => {
    const item = fields.make(uuid(), items.length);
    onChange([...items, item]);
    setOpen(item.id);
  };
  return (
    <Section>
      <Heading level={2} note={String(items.length)}>
        {title}
      </Heading>
      <View role="list" aria-label={title}>
        {items.map((item) => (
          <View key={item.id} role="listitem">
            <Stack gap={12} style={{ paddingVertical: 8 }}>
              <Row justify="space-between" gap={12}>
                <Text style={{ flex: 1 }}>{fields.name(item) || 'new'}</Text>
                <Button
                  size="small"
                  label={
                    open === item.id
                      ? `Close ${fields.name(item) || 'it'}`
                      : `Open ${fields.name(item) || 'it'}`
                  }
                  expanded={open === item.id}
                  onPress={() => setOpen(open === item.id ? null : item.id)}
                >
                  {open === item.id ? 'Close' : 'Open'}
                </Button>
              </Row>
              {below?.(item)}
              {open === item.id ? (
                <Stack gap={12}>
                  {fields.fields.map((field) => (
                    <OneField key={field.key} field={field} item={item} onChange={replace} />
                  ))}
                  <Row>
                    <Button
                      kind="danger"
                      size="small"
                      label={`Take out ${fields.name(item) || 'it'}`}
                      onPress={() => onChange(items.filter((x) => x.id !== item.id))}
                    >
                      Take out
                    </Button>
                  </Row>
                </Stack>
              ) : null}
            </Stack>
            <Rule />
          </View>
        ))}
      </View>
      <Row>
        <Button icon="add" label={`Add to ${title.toLowerCase()}`} onPress={add} />
      </Row>
    </Section>
  );
}

/** One field of an element, as its kind asks. */
export function OneField<T>({
  field,
  item,
  onChange,
}: {
  field: ListField<T>;
  item: T;
  onChange: (item: T) => void;
}) {
  const value = field.get(item);
  const put = (text: string) => onChange(field.set(item, text));
  if (field.flag)
    return (
      <Checkbox
        label={field.label}
        value={value === 'yes'}
        onChange={(on) => put(on ? 'yes' : 'no')}
      />
    );
  if (field.options)
    return <Select label={field.label} options={field.options} value={value} onChange={put} />;
  if (field.lazy)
    return <LazyField key={value} field={field} item={item} start={value} put={put} />;
  return (
    <TextField
      label={field.label}
      help={field.help}
      value={value}
      onChange={put}
      error={field.fault?.(value, item)}
      mono={field.mono}
    />
  );
}

interface LazyFieldProps<T> {
  field: ListField<T>;
  item: T;
  start: string;
  put: (text: string) => void;
}

/** A name others depend on: typed to the end before it takes effect. */
function LazyField<T>({ field, item, start, put }: LazyFieldProps<T>) {
  const [text, setText] = useState(start);
  const fault = field.fault?.(text, item);
  const keep = () => {
    if (!fault && text !== start) put(text);
  };
  return (
    <TextField
      label={field.label}
      value={text}
      onChange={setText}
      onBlur={keep}
      onEnter={keep}
      error={fault}
      mono={field.mono}
    />
  );
}
