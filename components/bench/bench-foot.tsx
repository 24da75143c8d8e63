import { StyleSheet, View } from 'react-native';
import { Button } from '../ui/button';
import { IconButton } from '../ui/icon-button';
import { Row } from '../ui/layout';
import { colour, line } from '../ui/tokens';

export interface BenchFootProps {
  /** A reading is being taken: then there is only the way back. */
  reading: boolean;
  asks: boolean;
  ticked: boolean;
  /** Next lies under the left thumb. */
  left: boolean;
  onBack: () => void;
  onRead: () => void;
  onNext: () => void;
}

/** Back, reading, next: by big targets, next under the thumb of the hand that is free. */
export function BenchFoot({ reading, asks, ticked, left, onBack, onRead, onNext }: BenchFootProps) {
  return (
    <Row gap={12} align="stretch" style={[styles.foot, left && styles.turned]}>
      <IconButton size="bench" icon="back" label="Back" onPress={onBack} />
      {asks && !reading ? (
        <Button size="bench" icon="calipers" label="Reading" onPress={onRead} />
      ) : null}
      {reading ? null : (
        <View style={styles.next}>
          <Button
            size="bench"
            kind="primary"
            wide
            label={ticked ? 'Next step' : 'Done, next step'}
            iconAfter="next"
            onPress={onNext}
          >
            Next
          </Button>
        </View>
      )}
    </Row>
  );
}

const styles = StyleSheet.create({
  foot: { borderTopWidth: line.medium, borderTopColor: colour.ink, padding: 12 },
  turned: { flexDirection: 'row-reverse' },
  next: { flex: 1 },
});
