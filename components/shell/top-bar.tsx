import { Link as RouterLink, type Href } from 'expo-router';
import { type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { Icon } from '../ui/icon';
import { Text } from '../ui/text';
import { colour, line, touch } from '../ui/tokens';
import { webStyle } from '../ui/web-style';

export interface TopBarProps {
  title: string;
  sub?: ReactNode;
  /** Where Back leads; without it the title stands at the margin. */
  back?: string;
  backLabel?: string;
  /** `close` for what one leaves, as a bench copy. */
  backIcon?: 'back' | 'close';
  actions?: ReactNode;
  /** The title is the page's h1. */
  heading?: boolean;
}

/** The bar at the top of a phone's screen: back, title, two actions at most. */
export function TopBar(props: TopBarProps) {
  const { title, sub, back, backLabel = 'Back', backIcon = 'back', actions, heading } = props;
  const role = heading ? ({ role: 'heading', 'aria-level': 1, tabIndex: -1 } as const) : {};
  return (
    <View style={[styles.bar, back ? styles.withBack : undefined]} dataSet={{ print: 'no' }}>
      {back ? (
        <RouterLink href={back as Href} aria-label={backLabel} style={backLink}>
          <Icon name={backIcon} />
        </RouterLink>
      ) : null}
      <View style={styles.words}>
        <Text
          weight={600}
          numberOfLines={2}
          {...role}
          dataSet={heading ? { pageHeading: 'yes' } : undefined}
        >
          {title}
        </Text>
        {sub ? (
          <Text size="small" tone="ink2">
            {sub}
          </Text>
        ) : null}
      </View>
      {actions}
    </View>
  );
}

const backLink = webStyle({
  display: 'flex',
  width: touch.min,
  height: touch.min,
  alignItems: 'center',
  justifyContent: 'center',
});

const styles = StyleSheet.create({
  bar: webStyle({
    display: 'flex',
    flexDirection: 'row',
    alignItems: 'center',
    gap: 8,
    minHeight: 56,
    paddingLeft: 16,
    paddingRight: 4,
    borderBottomWidth: line.thin,
    borderBottomStyle: 'solid',
    borderBottomColor: colour.ink,
    backgroundColor: colour.film,
  }),
  withBack: { paddingLeft: 4 },
  words: { flexGrow: 1, flexShrink: 1, paddingVertical: 4 },
});
