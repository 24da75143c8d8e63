import { Image, StyleSheet, View } from 'react-native';
import { type PlanCard } from '../../shared/api/plans';
import { mediaPath } from '../../shared/api/media';
import { Heading } from '../ui/heading';
import { Row, Rule, Stack } from '../ui/layout';
import { Link } from '../ui/link';
import { Text } from '../ui/text';
import { colour, line } from '../ui/tokens';
import { Duration } from './duration';

const skills: Record<string, string> = {
  first: 'a first build',
  some: 'some practice',
  practised: 'practised hands',
};

/** A plan in the list: drawing, title, maker, what it takes. */
export function PlanRow({ card }: { card: PlanCard }) {
  return (
    <View role="listitem">
      <Row gap={16} align="flex-start" style={styles.row}>
        <View style={styles.frame}>
          {card.cover ? (
            <Image
              source={{ uri: mediaPath(card.cover, 'thumb') }}
              style={styles.picture}
              alt={card.coverAlt}
              resizeMode="cover"
            />
          ) : null}
        </View>
        <Stack gap={4} style={styles.words}>
          <Heading level={2} ruled={false}>
            <Link href={`/plans/${card.slug}`}>{card.title}</Link>
          </Heading>
          <Text size="note" tone="ink2">
            {card.maker.displayName}
            {card.maker.shopName ? `, ${card.maker.shopName}` : ''}. Rev {card.letter}
          </Text>
          <Text size="note">{card.summary}</Text>
          <Row gap={16} align="baseline" wrap>
            <Text size="note">
              <Duration minutes={card.handsOn} /> hands on
            </Text>
            <Text size="note" tone="ink2">
              {card.steps} steps, {skills[card.skill] ?? card.skill}
            </Text>
            {card.benchCopies > 0 ? (
              <Text size="note" tone="ink2">
                on {card.benchCopies} {card.benchCopies === 1 ? 'bench' : 'benches'}
              </Text>
            ) : null}
          </Row>
        </Stack>
      </Row>
      <Rule />
    </View>
  );
}

const styles = StyleSheet.create({
  row: { paddingVertical: 16 },
  frame: {
    width: 112,
    height: 84,
    borderWidth: line.thin,
    borderColor: colour.rule,
    backgroundColor: colour.well,
  },
  picture: { width: '100%', height: '100%' },
  words: { flex: 1, minWidth: 0, alignSelf: 'auto' },
});
