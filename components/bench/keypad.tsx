import { StyleSheet, View } from 'react-native';
import { Button } from '../ui/button';
import { IconButton } from '../ui/icon-button';
import { webStyle } from '../ui/web-style';

const digits = ['1', '2', '3', '4', '5', '6', '7', '8', '9', '0'];
const inchKeys = ['/2', '/4', '/8', '/16', '/32', '/64'];

export interface KeypadProps {
  unit: 'mm' | 'in';
  /** A digit, a fraction's lower half, a space between whole and fraction, a point, or `erase`. */
  onKey: (key: string) => void;
}

/** Keys for gluey fingers, 56 px; a hardware keyboard or caliper types into the field as well. */
export function Keypad({ unit, onKey }: KeypadProps) {
  const more = unit === 'in' ? [...inchKeys, ' ', '.'] : ['.'];
  return (
    <View role="group" aria-label="Keypad" style={styles.grid}>
      {[...digits, ...more].map((key) => (
        <Button
          key={key}
          size="bench"
          label={key === ' ' ? 'and' : key === '.' ? 'point' : key}
          onPress={() => onKey(key)}
        >
          {key === ' ' ? 'and' : key}
        </Button>
      ))}
      <IconButton size="bench" icon="erase" label="Erase the last" onPress={() => onKey('erase')} />
    </View>
  );
}

const styles = StyleSheet.create({
  grid: webStyle({
    display: 'grid',
    gridTemplateColumns: 'repeat(auto-fill, minmax(64px, 1fr))',
    gap: '8px',
  }),
});
