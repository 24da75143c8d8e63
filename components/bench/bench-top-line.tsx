import { type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { useRouter } from 'expo-router';
import { useOnline, useOutbox } from '../data/outbox-hooks';
import { ThemeButton } from '../shell/theme-choice';
import { Heading } from '../ui/heading';
import { IconButton } from '../ui/icon-button';
import { Row } from '../ui/layout';
import { Text } from '../ui/text';
import { colour, line } from '../ui/tokens';

/** Says in a line how things stand with the signal. */
function useSignalLine(copyId: string): string {
  const online = useOnline();
  const jobs = useOutbox(copyId);
  const waiting = jobs.filter((j) => j.state === 'waiting').length;
  const refused = jobs.length - waiting;
  if (refused > 0) return `${refused} not taken; see Bench`;
  if (!online)
    return waiting > 0
      ? `No signal. ${waiting} kept on this device`
      : 'No signal. Kept on this device';
  return waiting > 0 ? `Sending ${waiting}` : 'All sent';
}

interface TopLineProps {
  at: number;
  count: number;
  copyId: string;
  children: ReactNode;
}

/** Where one is, how it stands with the signal, and what the hands want at once. */
export function TopLine({ at, count, copyId, children }: TopLineProps) {
  const signal = useSignalLine(copyId);
  const router = useRouter();
  return (
    <Row gap={8} justify="space-between" style={styles.bar}>
      <IconButton
        kind="bare"
        size="bench"
        icon="close"
        label="Leave the bench"
        onPress={() => router.push('/bench')}
      />
      <View style={styles.words}>
        <Heading level={1} size="lead">
          Step {at + 1} of {count}
        </Heading>
        <Text size="note" tone="ink2">
          {signal}
        </Text>
      </View>
      <ThemeButton size="bench" />
      {children}
    </Row>
  );
}

const styles = StyleSheet.create({
  bar: {
    borderBottomWidth: line.medium,
    borderBottomColor: colour.ink,
    paddingHorizontal: 8,
    minHeight: 64,
  },
  words: { flex: 1, minWidth: 0 },
});
