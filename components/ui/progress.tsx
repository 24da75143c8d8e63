import { StyleSheet, View } from 'react-native';
import { Figure } from './figure';
import { colour, line } from './tokens';
import { webStyle } from './web-style';

export interface ProgressProps {
  /** What goes forward: `Uploading clip.mov`. */
  label: string;
  /** From 0 to 1. */
  value: number;
  /** Without the figure at the right end. */
  bare?: boolean;
}

const quarters = [0.25, 0.5, 0.75];

/** How far: a measured bar with marks at the quarters, dyed up to the place. */
export function Progress({ label, value, bare }: ProgressProps) {
  const share = Math.min(1, Math.max(0, Number.isFinite(value) ? value : 0));
  const percent = Math.round(share * 100);
  return (
    <View style={styles.row}>
      <View
        role="progressbar"
        aria-label={label}
        aria-valuemin={0}
        aria-valuemax={100}
        aria-valuenow={percent}
        style={styles.frame}
      >
        <View style={styles.bar}>
          <View style={[styles.dye, { width: `${share * 100}%` }]} />
          {quarters.map((q) => (
            <View
              key={q}
              style={[
                styles.mark,
                { left: `${q * 100}%`, backgroundColor: q < share ? colour.scribe : colour.ink },
              ]}
            />
          ))}
        </View>
        <View style={[styles.place, { left: `${share * 100}%` }]} />
      </View>
      {bare ? null : <Figure figure={{ whole: percent, unit: '%' }} size="note" />}
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'center', gap: 12, alignSelf: 'stretch' },
  frame: { flexGrow: 1, height: 20, justifyContent: 'center' },
  bar: webStyle({
    height: 16,
    borderWidth: line.medium,
    borderColor: colour.ink,
    backgroundColor: colour.sheet,
    overflow: 'hidden',
  }),
  dye: { position: 'absolute', left: 0, top: 0, bottom: 0, backgroundColor: colour.dye },
  mark: { position: 'absolute', top: 0, bottom: 0, width: line.medium },
  place: {
    position: 'absolute',
    top: 0,
    bottom: 0,
    width: line.thick,
    marginLeft: -1.25,
    backgroundColor: colour.blue,
  },
});
