import Head from 'expo-router/head';
import { type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { Heading } from '../ui/heading';
import { Row } from '../ui/layout';
import { Text } from '../ui/text';
import { layer } from '../ui/tokens';
import { webStyle } from '../ui/web-style';
import { useArrival } from './arrival';
import { TopBar } from './top-bar';

export interface PageHeadProps {
  /** The page's title: in the browser's tab, read out on arrival and, unless `heading` is false, its h1. */
  title: string;
  /** Small line beside or under the title: `Draft toward rev A. Kept 14:22`. */
  sub?: ReactNode;
  /** Buttons at the right end; in the bar IconButtons fit best. */
  actions?: ReactNode;
  /** Where Back in the phone's bar leads. */
  back?: string;
  /** False where the screen draws its own `<Heading level={1}>`; the bar then says `barTitle`. */
  heading?: boolean;
  /** What the phone's bar says if not the title, e.g. the place one came from. */
  barTitle?: string;
  /** False leaves the phone's bar out. */
  bar?: boolean;
  /** For search engines and link previews. */
  description?: string;
}

/**
 * First thing in every screen. Sets the tab's title, tells who listens where they are, and draws
 * the phone's top bar and, from 640 px on, the h1.
 */
export function PageHead(props: PageHeadProps) {
  const { title, sub, actions, back, heading = true, barTitle, bar = true, description } = props;
  useArrival(title);
  return (
    <>
      <Head>
        <title>{`${title} · Scantling`}</title>
        {description ? <meta name="description" content={description} /> : null}
      </Head>
      {bar ? (
        <View dataSet={{ show: 'phone' }} style={styles.bar}>
          <TopBar
            title={barTitle ?? title}
            sub={sub}
            back={back}
            actions={actions}
            heading={heading}
          />
        </View>
      ) : null}
      {heading ? (
        <View dataSet={{ show: bar ? 'above-phone' : 'always', head: 'yes' }}>
          <Row gap={16} align="flex-end" justify="space-between">
            <Row gap={12} align="baseline" wrap style={styles.words}>
              <Heading level={1}>{title}</Heading>
              {sub ? (
                <Text size="note" tone="ink2">
                  {sub}
                </Text>
              ) : null}
            </Row>
            {actions}
          </Row>
        </View>
      ) : null}
    </>
  );
}

const styles = StyleSheet.create({
  bar: webStyle({ position: 'sticky', top: 0, zIndex: layer.bar }),
  words: { flexShrink: 1 },
});
