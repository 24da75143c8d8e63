import { useState, type ReactNode } from 'react';
import { View } from 'react-native';
import { v7 as uuid } from 'uuid';
import { toast } from '../../ui/announcer';
import { Button } from '../../ui/button';
import { Heading } from '../../ui/heading';
import { Row, Rule, Section, Stack } from '../../ui/layout';
import { Text } from '../../ui/text';
import { webStyle } from '../../ui/web-style';
import { type Change, type ListFields } from './list-field';
import { OneField } from './one-field';

export interface ListEditorProps<T extends { id: string }> {
  title: string;
  fields: ListFields<T>;
  items: readonly T[];
  /** Changes the list as it stands when the change is made, so that an undo keeps what came since. */
  onChange: (change: (items: readonly T[]) => T[]) => void;
  /** The element that is open at first, when something leads to it. */
  start?: string | null;
  /** What stands under a line, closed or open. */
  below?: (item: T, open: boolean) => ReactNode;
  /** 2 for a list of the plan, 3 for one inside a part of the page. */
  level?: 2 | 3;
  /** The title stands above already. */
  untitled?: boolean;
}

/** A list with one element put back where it was. */
export function putBack<T>(items: readonly T[], item: T, at: number): T[] {
  return [...items.slice(0, at), item, ...items.slice(at)];
}

/** A list of a plan: lines that open into their fields. */
export function ListEditor<T extends { id: string }>(props: ListEditorProps<T>) {
  const { title, fields, items, onChange, start = null, below, level = 2 } = props;
  const [open, setOpen] = useState<string | null>(start);
  const makers =
    typeof fields.make === 'function'
      ? [{ label: `Add to ${title.toLowerCase()}`, make: fields.make }]
      : fields.make;
  const takeOut = (gone: T, at: number) => {
    onChange((list) => list.filter((x) => x.id !== gone.id));
    toast({
      text: `${fields.name(gone) || 'It'} was taken out.`,
      action: {
        label: 'Put it back',
        onPress: () => onChange((list) => putBack(list, gone, at)),
      },
    });
  };
  return (
    <Section>
      {props.untitled ? null : (
        <Heading level={level} note={String(items.length)}>
          {title}
        </Heading>
      )}
      <View role="list" aria-label={title}>
        {items.map((item, at) => (
          <View key={item.id} role="listitem">
            <Element
              fields={fields}
              item={item}
              open={open === item.id}
              onOpen={(on) => setOpen(on ? item.id : null)}
              onChange={(change) =>
                onChange((list) => list.map((x) => (x.id === item.id ? change(x) : x)))
              }
              onTakeOut={() => takeOut(item, at)}
              below={below?.(item, open === item.id)}
            />
            <Rule />
          </View>
        ))}
      </View>
      <Row gap={8} wrap>
        {makers.map(({ label, make }) => (
          <Button
            key={label}
            icon="add"
            size={level === 2 ? 'touch' : 'small'}
            label={label}
            onPress={() => {
              const item = make(uuid(), items.length);
              onChange((list) => [...list, item]);
              setOpen(item.id);
            }}
          />
        ))}
      </Row>
    </Section>
  );
}

interface ElementProps<T> {
  fields: ListFields<T>;
  item: T;
  open: boolean;
  onOpen: (open: boolean) => void;
  onChange: Change<T>;
  onTakeOut: () => void;
  below: ReactNode;
}

function Element<T extends { id: string }>(props: ElementProps<T>) {
  const { fields, item, open, onOpen, onChange, onTakeOut, below } = props;
  const name = fields.name(item);
  const list = typeof fields.fields === 'function' ? fields.fields(item) : fields.fields;
  return (
    <Stack gap={12} style={{ paddingVertical: 8 }}>
      <Row justify="space-between" gap={12}>
        <Text style={{ flex: 1 }}>{name || 'new'}</Text>
        <Button
          size="small"
          label={`${open ? 'Close' : 'Open'} ${name || 'it'}`}
          expanded={open}
          onPress={() => onOpen(!open)}
        >
          {open ? 'Close' : 'Open'}
        </Button>
      </Row>
      {below}
      {open ? (
        <Stack gap={12}>
          <View style={grid}>
            {list.map((field) => (
              <View key={field.key} style={'draw' in field || field.many ? across : null}>
                <OneField field={field} item={item} onChange={onChange} />
              </View>
            ))}
          </View>
          <Row>
            <Button
              kind="danger"
              size="small"
              label={`Take out ${name || 'it'}`}
              onPress={onTakeOut}
            >
              Take out
            </Button>
          </Row>
        </Stack>
      ) : null}
    </Stack>
  );
}

const grid = webStyle({
  display: 'grid',
  gridTemplateColumns: 'repeat(auto-fill, minmax(min(100%, 220px), 1fr))',
  columnGap: 16,
  rowGap: 12,
  alignItems: 'start',
});
const across = webStyle({ gridColumn: '1 / -1' });
