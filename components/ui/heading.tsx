import { type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { RuledLine } from './dimension-line';
import { Text } from './text';
import { space, type TypeSize } from './tokens';

export type HeadingLevel = 1 | 2 | 3 | 4 | 5 | 6;

export interface HeadingProps {
  /** Real h1–h6. One h1 on a page; no level is left out. */
  level: HeadingLevel;
  children: ReactNode;
  /** Quiet note at the right end: a count, a unit, a state. */
  note?: ReactNode;
  size?: TypeSize;
  /** Stands on its dimension line; default for every level but 1. */
  ruled?: boolean;
  nativeID?: string;
}

const sizes: Record<HeadingLevel, TypeSize> = {
  1: 'title',
  2: 'lead',
  3: 'body',
  4: 'body',
  5: 'note',
  6: 'note',
};

/** A heading standing on its own dimension line. */
export function Heading({
  level,
  children,
  note,
  size,
  ruled = level > 1,
  nativeID,
}: HeadingProps) {
  const words = (
    <Text
      role="heading"
      aria-level={level}
      size={size ?? sizes[level]}
      weight={700}
      nativeID={nativeID}
      style={styles.words}
      dataSet={level === 1 ? { pageHeading: 'yes' } : undefined}
      tabIndex={level === 1 ? -1 : undefined}
    >
      {children}
    </Text>
  );
  if (!ruled && note === undefined) return words;
  return (
    <View>
      <View style={[styles.row, ruled && styles.ruled]}>
        {words}
        {note === undefined ? null : typeof note === 'string' ? (
          <Text size="small" tone="ink2">
            {note}
          </Text>
        ) : (
          note
        )}
      </View>
      {ruled ? <RuledLine /> : null}
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'flex-end', columnGap: space.s12 },
  ruled: { paddingBottom: 7 },
  words: { flexGrow: 1, flexShrink: 1 },
});
