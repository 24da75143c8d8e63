import { StyleSheet, View } from 'react-native';
import { colour, line } from '../ui/tokens';

/** The stick before anything is on it: dashed and still. Holds the place, so nothing jumps. */
export function BlankStick({
  height = 24,
  tall,
}: {
  height?: number | `${number}%`;
  tall?: boolean;
}) {
  return <View aria-hidden style={[styles.blank, { height }, tall ? styles.tall : styles.flat]} />;
}

const styles = StyleSheet.create({
  blank: { borderWidth: line.medium, borderStyle: 'dashed', borderColor: colour.rule },
  flat: { marginTop: 24, marginBottom: 14, marginRight: 8, marginLeft: 2 },
  tall: { width: 22, marginLeft: 16 },
});
