import { useId, useState, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { Icon } from './icon';
import { Row } from './layout';
import { PressArea } from './pressable';
import { Text } from './text';
import { colour, line, touch } from './tokens';
import { webStyle } from './web-style';

export interface FoldProps {
  title: string;
  /** Quiet note at the right end: how many, what is set. */
  note?: string;
  level?: 2 | 3 | 4;
  /** Open at first, where this person has not opened or closed one of this title yet. */
  open?: boolean;
  children: ReactNode;
}

/** Which folds are open, by title: the same part of the next step stands as it was left. */
const left = new Map<string, boolean>();

/** A part of a form that is put away until it is wanted. */
export function Fold({ title, note, level = 3, open: first = false, children }: FoldProps) {
  const id = useId();
  const [open, setOpen] = useState(left.get(title) ?? first);
  const turn = () => {
    left.set(title, !open);
    setOpen(!open);
  };
  return (
    <View style={styles.fold}>
      <View role="heading" aria-level={level}>
        <PressArea
          role="button"
          label={note ? `${title}, ${note}` : title}
          aria-expanded={open}
          aria-controls={open ? id : undefined}
          onPress={turn}
          style={(look) => [styles.head, look.hovered && styles.hovered]}
        >
          <Row gap={8} justify="space-between">
            <Row gap={8} style={styles.title}>
              <Icon name={open ? 'up' : 'down'} size={20} />
              <Text weight={600}>{title}</Text>
            </Row>
            {note ? (
              <Text size="note" tone="ink2">
                {note}
              </Text>
            ) : null}
          </Row>
        </PressArea>
      </View>
      {open ? (
        <View nativeID={id} style={styles.content}>
          {children}
        </View>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  fold: webStyle({
    borderTopWidth: line.thin,
    borderTopStyle: 'solid',
    borderTopColor: colour.rule,
  }),
  head: webStyle({
    minHeight: touch.min,
    justifyContent: 'center',
    cursor: 'pointer',
    paddingLeft: 2,
    paddingRight: 2,
  }),
  hovered: { backgroundColor: colour.well },
  title: { flexShrink: 1 },
  content: { paddingTop: 4, paddingBottom: 16, gap: 12 },
});
