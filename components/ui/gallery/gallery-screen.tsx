import { StyleSheet, View } from 'react-native';
import { NotFoundScreen } from '../../shell/not-found-screen';
import { PageHead } from '../../shell/page-head';
import { Heading } from '../heading';
import { Page } from '../layout';
import { useMounted } from '../use-media';
import { webStyle } from '../web-style';
import { ChoicesSheet, InputsSheet, PickSheet } from './input-sheets';
import { ButtonsSheet, MarksSheet, MenuSheet, TabsSheet } from './press-sheets';
import { SticksSheet, TallSticksSheet } from './stick-sheets';
import { GalleryStack } from './show-sheets';

/** The server puts this in the page's head where development pages may be seen. */
const developmentMeta = 'meta[name="scantling-mode"][content="development"]';

/** Every primitive in every state, day beside night. Development only. */
export function GalleryScreen() {
  const mounted = useMounted();
  if (!mounted) return null;
  if (!__DEV__ && !document.querySelector(developmentMeta)) return <NotFoundScreen />;
  return (
    <View role="main">
      <Page width="full">
        <PageHead title="Gallery" sub="every primitive, every state, both lights" />
        <View style={styles.sheets}>
          <Theme name="day" />
          <Theme name="night" />
        </View>
      </Page>
    </View>
  );
}

function Theme({ name }: { name: 'day' | 'night' }) {
  return (
    <View dataSet={{ theme: name }} style={styles.theme}>
      <Heading level={2} ruled={false} size="heading">
        {name === 'day' ? 'Day' : 'Night'}
      </Heading>
      <SticksSheet theme={name} />
      <TallSticksSheet theme={name} />
      <ButtonsSheet />
      <InputsSheet />
      <PickSheet />
      <ChoicesSheet />
      <TabsSheet theme={name} />
      <MarksSheet />
      <MenuSheet theme={name} />
      <GalleryStack theme={name} />
    </View>
  );
}

const styles = StyleSheet.create({
  sheets: webStyle({
    display: 'grid',
    gridTemplateColumns: 'repeat(auto-fit, minmax(min(100%, 520px), 1fr))',
    gap: 24,
    marginLeft: -16,
    marginRight: -16,
  }),
  theme: webStyle({ padding: 16, gap: 20, minWidth: 0 }),
});
