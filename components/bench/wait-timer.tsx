import { StyleSheet } from 'react-native';
import { type Wait } from '../../shared/plan/document';
import { type Entry } from '../../shared/plan/bench/entry';
import { Button } from '../ui/button';
import { Figure } from '../ui/figure';
import { Icon } from '../ui/icon';
import { Row, Stack } from '../ui/layout';
import { Text } from '../ui/text';
import { colour, line } from '../ui/tokens';
import { armBell } from './bell';
import { type NewEntry } from './bench-queries';

const pad = (n: number) => String(n).padStart(2, '0');

/** Seconds as h:mm:ss or mm:ss. */
export function timeLeft(seconds: number): string {
  const whole = Math.max(0, Math.ceil(seconds));
  const h = Math.floor(whole / 3600);
  const rest = `${pad(Math.floor(whole / 60) % 60)}:${pad(whole % 60)}`;
  return h > 0 ? `${h}:${rest}` : rest;
}

export interface WaitTimerProps {
  wait: Wait;
  started: { startedAt: string; ended: boolean } | undefined;
  now: number;
  add: (entry: NewEntry) => Promise<Entry>;
}

/** A wait as a timer; it counts from when it was started, so a reload does not matter. */
export function WaitTimer({ wait, started, now, add }: WaitTimerProps) {
  const running = started !== undefined && !started.ended;
  const left = running
    ? wait.minutes * 60 - (now - Date.parse(started.startedAt)) / 1000
    : wait.minutes * 60;
  const over = running && left <= 0;
  return (
    <Row gap={12} justify="space-between" wrap style={styles.box}>
      <Row gap={12}>
        <Icon name="wait" size={28} />
        <Stack gap={4} style={{ alignSelf: 'auto' }}>
          <Figure
            figure={{ decimal: timeLeft(left), spoken: `${Math.ceil(left / 60)} minutes` }}
            size="bench"
            weight={700}
          />
          <Text tone="ink2">
            {over
              ? 'The wait is over'
              : started?.ended
                ? 'Ended'
                : `${wait.what || 'wait'}${wait.nextMayStart ? ', the next step may start' : ''}`}
          </Text>
        </Stack>
      </Row>
      {running ? (
        <Button
          size="bench"
          label={over ? 'Over' : 'End it'}
          onPress={() => void add({ kind: 'wait-end', elementId: wait.id })}
        />
      ) : (
        <Button
          size="bench"
          label="Start the wait"
          onPress={() => {
            armBell();
            void add({
              kind: 'wait-start',
              elementId: wait.id,
              startedAt: new Date().toISOString(),
            });
          }}
        />
      )}
    </Row>
  );
}

const styles = StyleSheet.create({
  box: { borderWidth: line.medium, borderColor: colour.ink, padding: 12 },
});
