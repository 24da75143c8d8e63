import { type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { Button } from './button';
import { Heading, type HeadingLevel } from './heading';
import { Text } from './text';
import { VerdictShape } from './verdict';
import { colour, line, proseWidth } from './tokens';
import { VisuallyHidden } from './visually-hidden';
import { webStyle } from './web-style';

export interface EmptyStateProps {
  /** What is not here: `Nothing on the bench`. */
  title: string;
  /** What will be here. */
  children: ReactNode;
  /** The one action that puts something here; a second, plain one at most. */
  actions?: ReactNode;
  level?: HeadingLevel;
}

/** A dashed stick with nothing on it, what will be here, and the action that puts it there. */
export function EmptyState({ title, children, actions, level = 2 }: EmptyStateProps) {
  return (
    <View style={styles.empty}>
      <View style={styles.blankStick} aria-hidden />
      <View style={styles.words}>
        <Heading level={level} size="heading" ruled={false}>
          {title}
        </Heading>
        <Text tone="ink2">{children}</Text>
      </View>
      {actions ? <View style={styles.actions}>{actions}</View> : null}
    </View>
  );
}

export interface LoadingLinesProps {
  /** What is being fetched, read out: `Loading the plan`. */
  label: string;
  /** Lines of text to come. */
  lines?: number;
}

const lengths = ['57%', '100%', '92%', '68%', '84%'] as const;

/** Setting-out lines: dashed and still. */
export function LoadingLines({ label, lines = 4 }: LoadingLinesProps) {
  return (
    <View role="status" aria-busy style={styles.loading}>
      <VisuallyHidden>{label}</VisuallyHidden>
      {Array.from({ length: lines }, (_, i) => (
        <View key={i} style={[styles.dashes, { width: lengths[i % lengths.length] }]} aria-hidden />
      ))}
    </View>
  );
}

export interface ErrorStateProps {
  /** What happened, short: `The report did not go out`. */
  title: string;
  /** What happened, in a sentence: `The server stopped answering after photo 2 of 5.` */
  happened?: ReactNode;
  /** What was kept, and where. */
  kept?: ReactNode;
  /** What to do. */
  todo?: ReactNode;
  onRetry?: () => void;
  retryLabel?: string;
  retrying?: boolean;
  /** Other ways out, plain or quiet buttons. */
  actions?: ReactNode;
  /** Stable code for whoever is asked. */
  code?: string;
  /** When, as shown: `16:20`. */
  at?: string;
  level?: HeadingLevel;
}

/** What happened, what is kept, what to do, and a code for whoever is asked. */
export function ErrorState(props: ErrorStateProps) {
  const {
    title,
    happened,
    kept,
    todo,
    onRetry,
    retryLabel = 'Try again',
    actions,
    code,
    at,
    level = 2,
  } = props;
  return (
    <View style={styles.error} role="alert">
      <View style={styles.band}>
        <View style={styles.square}>
          <VerdictShape kind="fails" size={18} />
        </View>
        <View style={styles.words}>
          <Heading level={level} size="lead" ruled={false}>
            {title}
          </Heading>
          {happened ? <Text>{happened}</Text> : null}
        </View>
      </View>
      <Part title="What is kept" level={level}>
        {kept}
      </Part>
      <Part title="What to do" level={level}>
        {todo}
      </Part>
      {onRetry || actions ? (
        <View style={styles.actions}>
          {onRetry ? (
            <Button
              kind="primary"
              label={retryLabel}
              onPress={onRetry}
              busy={props.retrying}
              wide
            />
          ) : null}
          {actions}
        </View>
      ) : null}
      {code ? (
        <Text size="small" tone="ink2">
          If somebody asks: code <Text mono>{code}</Text>
          {at ? (
            <>
              , at <Text mono>{at}</Text>
            </>
          ) : null}
        </Text>
      ) : null}
    </View>
  );
}

function Part({
  title,
  level,
  children,
}: {
  title: string;
  level: HeadingLevel;
  children: ReactNode;
}) {
  if (!children) return null;
  return (
    <View style={styles.part}>
      <Heading level={Math.min(6, level + 1) as HeadingLevel} size="body">
        {title}
      </Heading>
      {typeof children === 'string' ? <Text>{children}</Text> : children}
    </View>
  );
}

const styles = StyleSheet.create({
  empty: { gap: 20, maxWidth: 480, alignSelf: 'stretch' },
  blankStick: {
    height: 24,
    borderWidth: line.medium,
    borderStyle: 'dashed',
    borderColor: colour.ink,
  },
  words: { gap: 4, flexShrink: 1, maxWidth: proseWidth },
  actions: { gap: 8 },
  loading: { gap: 19, paddingVertical: 12, alignSelf: 'stretch' },
  dashes: webStyle({
    height: 1,
    backgroundImage: `repeating-linear-gradient(90deg, ${colour.rule} 0 6px, transparent 6px 10px)`,
  }),
  error: { gap: 20, maxWidth: 560, alignSelf: 'stretch' },
  band: {
    flexDirection: 'row',
    gap: 16,
    paddingVertical: 14,
    borderTopWidth: line.medium,
    borderTopColor: colour.fails,
    borderBottomWidth: line.thin,
    borderBottomColor: colour.ink,
  },
  square: { paddingTop: 5 },
  part: { gap: 12 },
});
