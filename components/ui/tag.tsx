import { type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { Icon, type IconName } from './icon';
import { PressArea, type ForcedLook } from './pressable';
import { Text } from './text';
import { colour, line, radius, type ColourRole } from './tokens';
import { webStyle } from './web-style';

/** plain: a fact · on: chosen or the kind of a critique · reference: leads to a thing of the plan · absent: not here. */
export type TagKind = 'plain' | 'on' | 'reference' | 'absent';

const faces: Record<TagKind, { ground: string; edge: ColourRole; ink: ColourRole }> = {
  plain: { ground: 'transparent', edge: 'rule', ink: 'ink' },
  on: { ground: colour.ink, edge: 'ink', ink: 'film' },
  reference: { ground: 'transparent', edge: 'blue', ink: 'blue' },
  absent: { ground: 'transparent', edge: 'rule', ink: 'ink3' },
};

export interface TagProps {
  /** Words on it; accessible name where it can be pressed. */
  label: string;
  /** Drawn instead of the label, e.g. with a Figure. */
  children?: ReactNode;
  kind?: TagKind;
  icon?: IconName;
  /** Makes it a filter button: `on` is its pressed state. */
  onPress?: () => void;
  look?: ForcedLook;
}

/** A small framed word. With `onPress` it is a filter that is on or off. */
export function Tag({ label, children, kind = 'plain', icon, onPress, look }: TagProps) {
  const face = faces[kind];
  const box = [
    styles.box,
    { backgroundColor: face.ground, borderColor: colour[face.edge] },
    kind === 'absent' && styles.dashed,
  ];
  const content = (
    <>
      {icon ? <Icon name={icon} size={15} tone={face.ink} /> : null}
      <Text size="small" style={{ color: colour[face.ink] }}>
        {children ?? label}
      </Text>
    </>
  );
  if (!onPress) return <View style={box}>{content}</View>;
  return (
    <PressArea
      role="button"
      label={label}
      labelledByContent={children === undefined}
      onPress={onPress}
      aria-pressed={kind === 'on'}
      look={look}
      dataSet={{ small: 'yes' }}
      style={(s) => [box, styles.pressable, s.hovered && kind !== 'on' && styles.hovered]}
    >
      {content}
    </PressArea>
  );
}

/** The square letter of a part: A, B, AA. */
export function PartMark({ letter, size = 'small' }: { letter: string; size?: 'small' | 'bench' }) {
  const big = size === 'bench';
  return (
    <View style={[styles.mark, big && styles.bigMark]}>
      <Text mono weight={600} style={big ? styles.bigLetter : styles.letter}>
        {letter}
      </Text>
    </View>
  );
}

/** A key of the keyboard, as in `move with Alt`. */
export function KeyHint({ keys }: { keys: string }) {
  return (
    <View style={styles.key}>
      <Text size="small" mono>
        {keys}
      </Text>
    </View>
  );
}

const styles = StyleSheet.create({
  box: webStyle({
    display: 'flex',
    flexDirection: 'row',
    alignItems: 'center',
    width: 'fit-content',
    maxWidth: '100%',
    gap: 5,
    paddingTop: 2,
    paddingBottom: 2,
    paddingLeft: 7,
    paddingRight: 7,
    borderWidth: line.thin,
    borderRadius: radius.tag,
  }),
  dashed: { borderStyle: 'dashed' },
  pressable: webStyle({ display: 'flex', minHeight: 32, cursor: 'pointer' }),
  hovered: { backgroundColor: colour.well },
  mark: webStyle({
    display: 'inline-flex',
    alignItems: 'center',
    justifyContent: 'center',
    width: 'fit-content',
    minWidth: 22,
    height: 22,
    paddingLeft: 5,
    paddingRight: 5,
    borderWidth: line.medium,
    borderColor: colour.ink,
    backgroundColor: colour.sheet,
    verticalAlign: 'middle',
  }),
  bigMark: { minWidth: 30, height: 30 },
  letter: { fontSize: 13, lineHeight: 16, letterSpacing: 0 },
  bigLetter: { fontSize: 20, lineHeight: 24, letterSpacing: 0 },
  key: {
    borderWidth: line.thin,
    borderColor: colour.rule,
    paddingHorizontal: 6,
    paddingVertical: 1,
  },
});
