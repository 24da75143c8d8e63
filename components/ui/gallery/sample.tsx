import { type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { Heading } from '../heading';
import { Row, Stack } from '../layout';
import { Text } from '../text';

/** One sheet of the gallery: heading, note, samples below. */
export function Sheet({
  title,
  note,
  children,
}: {
  title: string;
  note?: string;
  children: ReactNode;
}) {
  return (
    <View style={styles.sheet}>
      <Heading level={3} note={note}>
        {title}
      </Heading>
      <Stack gap={12}>{children}</Stack>
    </View>
  );
}

/** A row of samples with its name at the left. */
export function Sample({ name, children }: { name: string; children: ReactNode }) {
  return (
    <Row gap={12} wrap>
      <Text size="small" tone="ink2" style={styles.name}>
        {name}
      </Text>
      {children}
    </Row>
  );
}

const styles = StyleSheet.create({
  sheet: { gap: 14, marginBottom: 30 },
  name: { width: 74 },
});
