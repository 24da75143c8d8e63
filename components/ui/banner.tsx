import { type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { Icon } from './icon';
import { Link } from './link';
import { PressArea } from './pressable';
import { Text } from './text';
import { VerdictShape } from './verdict';
import { colour, line, type ColourRole } from './tokens';
import { webStyle } from './web-style';

export type BannerKind = 'holds' | 'risk' | 'fails' | 'note' | 'no-signal';

const faces: Record<BannerKind, { ground: ColourRole; edge: ColourRole; ink: 'ink' | 'film' }> = {
  holds: { ground: 'holdsWash', edge: 'holds', ink: 'ink' },
  risk: { ground: 'riskWash', edge: 'risk', ink: 'ink' },
  fails: { ground: 'failsWash', edge: 'fails', ink: 'ink' },
  note: { ground: 'blueWash', edge: 'blue', ink: 'ink' },
  'no-signal': { ground: 'ink', edge: 'ink', ink: 'film' },
};

export interface BannerProps {
  kind: BannerKind;
  children: ReactNode;
  action?: { label: string; onPress?: () => void; href?: string };
  /** Read out when it appears: default for `fails`, off for what was there from the start. */
  announce?: boolean;
}

/** A band across the page for what concerns all of it. */
export function Banner({ kind, children, action, announce = kind === 'fails' }: BannerProps) {
  const face = faces[kind];
  return (
    <View
      role={announce ? (kind === 'fails' ? 'alert' : 'status') : undefined}
      style={[
        styles.band,
        { backgroundColor: colour[face.ground], borderTopColor: colour[face.edge] },
      ]}
    >
      <BannerShape kind={kind} />
      <Text size="note" tone={face.ink} style={styles.words}>
        {children}
      </Text>
      {action?.href ? (
        <Text size="note">
          <Link href={action.href} tone="ink">
            {action.label}
          </Link>
        </Text>
      ) : action ? (
        <PressArea
          role="button"
          label={action.label}
          labelledByContent
          onPress={action.onPress}
          style={styles.action}
        >
          <Text size="note" tone={face.ink} style={styles.underline}>
            {action.label}
          </Text>
        </PressArea>
      ) : null}
    </View>
  );
}

function BannerShape({ kind }: { kind: BannerKind }) {
  if (kind === 'no-signal') return <Icon name="nosignal" size={22} tone="film" />;
  if (kind === 'note') return <Icon name="notice" size={20} tone="blue" />;
  return <VerdictShape kind={kind} size={kind === 'risk' ? 18 : 16} />;
}

const styles = StyleSheet.create({
  band: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: 12,
    borderTopWidth: line.thick,
    paddingVertical: 10,
    paddingHorizontal: 14,
  },
  words: { flexGrow: 1, flexShrink: 1, flexBasis: 0 },
  action: webStyle({
    minHeight: 44,
    marginTop: -10,
    marginBottom: -10,
    justifyContent: 'center',
    paddingLeft: 8,
    paddingRight: 8,
    cursor: 'pointer',
  }),
  underline: webStyle({ textDecorationLine: 'underline', textUnderlineOffset: 3 }),
});
