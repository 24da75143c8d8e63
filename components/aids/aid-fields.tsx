import { StyleSheet, View } from 'react-native';
import { Button } from '../ui/button';
import { Checkbox } from '../ui/checkbox';
import { Row, Stack } from '../ui/layout';
import { Select } from '../ui/select';
import { Text } from '../ui/text';
import { NumberFigureField, TextField } from '../ui/text-field';
import { rowCount, type AidField, type AidPart, type AidRows, type Values } from './form-values';
import { type Units } from './form-values';

interface FormProps {
  parts: readonly AidPart[];
  values: Values;
  errors: Readonly<Record<string, string>>;
  units: Units;
  onChange: (values: Values) => void;
}

/** The fields of an aid, side by side where they fit. */
export function AidFields(props: FormProps) {
  return (
    <View style={styles.grid}>
      {props.parts.map((part) =>
        part.kind === 'rows' ? (
          <Rows key={part.key} {...props} list={part} />
        ) : (
          <One key={part.key} {...props} field={part} at={part.key} />
        ),
      )}
    </View>
  );
}

const unitOf = (field: AidField, units: Units) =>
  field.kind === 'length' || field.kind === 'lengths'
    ? units
    : field.kind === 'temperature'
      ? units === 'in'
        ? '°F'
        : '°C'
      : field.unit;

function One(props: FormProps & { field: AidField; at: string }) {
  const { field, at, values, errors, units } = props;
  const set = (value: string) => props.onChange({ ...values, [at]: value });
  const common = {
    label: field.label,
    help: field.help,
    error: errors[at],
    optional: field.optional,
  };
  const value = values[at] ?? '';
  return (
    <View style={field.kind === 'lengths' || field.kind === 'words' ? styles.broad : styles.cell}>
      {field.kind === 'choice' ? (
        <Select
          {...common}
          optional={false}
          options={field.options ?? []}
          value={value}
          onChange={set}
        />
      ) : field.kind === 'yes' ? (
        <Checkbox
          label={field.label}
          help={field.help}
          value={value === 'yes'}
          onChange={(on) => set(on ? 'yes' : '')}
        />
      ) : field.kind === 'words' ? (
        <TextField {...common} value={value} onChange={set} maxLength={80} />
      ) : (
        <NumberFigureField
          {...common}
          unit={unitOf(field, units)}
          value={value}
          onChange={set}
          inputMode={field.kind === 'number' || field.kind === 'temperature' ? 'decimal' : 'text'}
          maxLength={200}
        />
      )}
    </View>
  );
}

function Rows(props: FormProps & { list: AidRows }) {
  const { list, values } = props;
  const count = rowCount(values, list.key);
  const put = (n: number, more: Record<string, string> = {}) =>
    props.onChange({ ...values, ...more, [`${list.key}.count`]: String(n) });
  const at = (i: number, key: string) => `${list.key}.${i}.${key}`;
  /** Takes row `i` out: the rows after it move up. */
  const drop = (i: number) => {
    const moved = Array.from({ length: count - 1 - i }, (_, k) => i + k).flatMap((row) =>
      list.columns.map(({ key }) => [at(row, key), values[at(row + 1, key)] ?? ''] as const),
    );
    put(count - 1, Object.fromEntries(moved));
  };
  const add = () =>
    put(
      count + 1,
      Object.fromEntries(
        list.columns.map(({ key }) => [at(count, key), values[at(count - 1, key)] ?? '']),
      ),
    );
  return (
    <Stack gap={16}>
      {Array.from({ length: count }, (_, i) => (
        <View key={i} role="group" aria-label={`${list.noun} ${i + 1}`} style={styles.row}>
          <Row justify="space-between">
            <Text weight={600}>{`${list.noun} ${i + 1}`}</Text>
            {count > 1 ? (
              <Button
                kind="quiet"
                size="small"
                label={`Take out ${list.noun.toLowerCase()} ${i + 1}`}
                onPress={() => drop(i)}
              />
            ) : null}
          </Row>
          <View style={styles.grid}>
            {list.columns.map((field) => (
              <One key={field.key} {...props} field={field} at={at(i, field.key)} />
            ))}
          </View>
        </View>
      ))}
      <Row>
        <Button label={`Add a ${list.noun.toLowerCase()}`} onPress={add} disabled={count >= 40} />
      </Row>
    </Stack>
  );
}

const styles = StyleSheet.create({
  grid: { flexDirection: 'row', flexWrap: 'wrap', columnGap: 16, rowGap: 16 },
  cell: { flexGrow: 1, flexBasis: 150, minWidth: 0, maxWidth: 360 },
  broad: { flexGrow: 1, flexBasis: 312, minWidth: 0 },
  row: { gap: 8 },
});
