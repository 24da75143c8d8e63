import { StyleSheet, View } from 'react-native';
import { PageHead } from '../shell/page-head';
import { Heading } from '../ui/heading';
import { Link } from '../ui/link';
import { Page, Rule, Section } from '../ui/layout';
import { Text } from '../ui/text';
import { screens } from './screens';

/** Every bench aid by its title. They need no account and no signal. */
export function AidsScreen() {
  return (
    <>
      <PageHead title="Bench aids" description="The shop’s arithmetic, each with its source." />
      <Page>
        <Text tone="ink2" size="lead">
          The shop’s arithmetic, each with its source and the range it answers in.
        </Text>
        <Section>
          <Heading level={2} note={String(screens.length)}>
            Aids
          </Heading>
          <View role="list" aria-label="Bench aids">
            {screens.map(({ aid }) => (
              <View key={aid.id} role="listitem">
                <View style={styles.row}>
                  <Text weight={600}>
                    <Link href={`/aids/${aid.id}`}>{aid.title}</Link>
                  </Text>
                  <Text tone="ink2">{aid.what}</Text>
                </View>
                <Rule />
              </View>
            ))}
          </View>
        </Section>
      </Page>
    </>
  );
}

const styles = StyleSheet.create({ row: { gap: 4, paddingVertical: 12 } });
