import { usePathname } from 'expo-router';
import { type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { SkipLink } from '../ui/skip-link';
import { webStyle } from '../ui/web-style';
import { Rail, TabBar } from './nav';
import { frameOf } from './places';

/** Id of the main landmark; the skip link leads there. */
export const mainId = 'content';

/** The frame around every screen: rail or tab bar, and the main landmark. */
export function Shell({ children }: { children: ReactNode }) {
  const frame = frameOf(usePathname());
  const bare = frame === 'bare';
  return (
    <View style={styles.shell} dataSet={{ shell: frame }}>
      <SkipLink to={mainId} />
      {bare ? null : <Rail frame={frame} />}
      <View style={styles.column}>
        <View role="main" nativeID={mainId} tabIndex={-1} style={styles.main}>
          {children}
        </View>
        {bare ? null : <TabBar />}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  shell: webStyle({
    display: 'flex',
    flexDirection: 'row',
    minHeight: '100dvh',
    alignItems: 'stretch',
  }),
  column: { flexGrow: 1, flexShrink: 1, flexBasis: 0, minWidth: 0 },
  main: { flexGrow: 1, flexShrink: 0 },
});
