import { StyleSheet, View } from 'react-native';
import { Button } from '../ui/button';
import { IconButton } from '../ui/icon-button';
import { Text } from '../ui/text';
import { colour } from '../ui/tokens';
import { webStyle } from '../ui/web-style';

/** Rows as they lie under the thumb; fractions beside the digits, `and` between whole and fraction. */
const inchRows = [
  ['1', '2', '3', '/2', '/4'],
  ['4', '5', '6', '/8', '/16'],
  ['7', '8', '9', '/32', '/64'],
  ['and', '0', '.', 'erase'],
] as const;
const mmRows = [
  ['1', '2', '3'],
  ['4', '5', '6'],
  ['7', '8', '9'],
  ['.', '0', 'erase'],
] as const;

/** What a key does to what is typed: a second fraction key changes the denominator. */
export function keyed(text: string, key: string): string {
  if (key === 'erase') return text.slice(0, -1);
  if (key === 'and') return text === '' || text.endsWith(' ') ? text : `${text} `;
  if (key.startsWith('/'))
    return /\/\d*$/.test(text)
      ? text.replace(/\/\d*$/, key)
      : /\d$/.test(text)
        ? `${text}${key}`
        : text;
  if (key === '.' && /[./]\d*$/.test(text)) return text;
  return `${text}${key}`;
}

const said = (key: string): string =>
  key === '.' ? 'point' : key.startsWith('/') ? `over ${key.slice(1)}` : key;

export interface KeypadProps {
  unit: 'mm' | 'in';
  value: string;
  onChange: (text: string) => void;
}

/** Keys for gluey fingers, 56 px; a hardware keyboard or caliper types into the field as well. */
export function Keypad({ unit, value, onChange }: KeypadProps) {
  const rows = unit === 'in' ? inchRows : mmRows;
  return (
    <View role="group" aria-label="Keypad" style={styles.pad}>
      {rows.map((row) => (
        <View key={row[0]} style={styles.row}>
          {row.map((key) => (
            <View key={key} style={[styles.key, key.startsWith('/') && styles.fraction]}>
              {key === 'erase' ? (
                <IconButton
                  size="bench"
                  icon="erase"
                  label="Erase the last"
                  onPress={() => onChange(keyed(value, key))}
                />
              ) : (
                <Button
                  wide
                  size="bench"
                  label={said(key)}
                  onPress={() => onChange(keyed(value, key))}
                >
                  <Text mono weight={600} size="lead">
                    {key}
                  </Text>
                </Button>
              )}
            </View>
          ))}
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  pad: { gap: 8 },
  row: webStyle({ display: 'flex', flexDirection: 'row', gap: '8px' }),
  key: webStyle({
    flex: '1 1 0px',
    minWidth: 0,
    display: 'flex',
    flexDirection: 'column',
    alignItems: 'stretch',
  }),
  fraction: { backgroundColor: colour.well },
});
