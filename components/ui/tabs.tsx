import { Link as RouterLink, type Href } from 'expo-router';
import { useEffect, useRef, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { arrowKeys, spacePresses } from './arrow-keys';
import { PressArea } from './pressable';
import { Text } from './text';
import { colour, line, touch } from './tokens';
import { webStyle } from './web-style';

export interface TabItem<V extends string> {
  value: V;
  label: string;
  /** After the label: a count or a shape. */
  after?: ReactNode;
}

export interface TabsProps<V extends string> {
  /** Accessible name of the row. */
  label: string;
  tabs: readonly TabItem<V>[];
  value: V;
  onChange: (value: V) => void;
  /** Prefix for the ids that tie tab and panel; give the same to TabPanel. */
  id: string;
  /** Fills the width (phone) or stands at the left (wide bars). */
  fill?: boolean;
}

/** Tabs over panels on one page; a long mark below the current one. Arrows choose. */
export function Tabs<V extends string>({
  label,
  tabs,
  value,
  onChange,
  id,
  fill = true,
}: TabsProps<V>) {
  const row = useRef<View>(null);
  // On a phone the row is longer than the screen: the chosen one is brought into sight.
  useEffect(() => {
    const list = row.current as unknown as HTMLElement | null;
    const tab = list?.querySelector<HTMLElement>('[aria-selected="true"]');
    if (list && tab) list.scrollLeft = tab.offsetLeft - (list.clientWidth - tab.clientWidth) / 2;
  }, [value]);
  return (
    <View role="tablist" aria-label={label} style={styles.row} ref={row}>
      {tabs.map((tab) => {
        const on = tab.value === value;
        const choose = () => onChange(tab.value);
        return (
          <PressArea
            key={tab.value}
            role="tab"
            label={tab.label}
            labelledByContent
            aria-selected={on}
            aria-controls={`${id}-panel`}
            nativeID={`${id}-${tab.value}`}
            tabIndex={on ? 0 : -1}
            onPress={choose}
            onKeyDown={(event) => {
              spacePresses(event, choose);
              arrowKeys(event, {
                group: 'tablist',
                item: 'tab',
                axis: 'row',
                onMove: (element) => onChange(element.dataset.value as V),
              });
            }}
            dataSet={{ value: tab.value, focusInside: 'yes' }}
            style={(s) => [styles.tab, fill && styles.fill, s.hovered && !on && styles.hovered]}
          >
            <TabFace on={on} label={tab.label} after={tab.after} />
          </PressArea>
        );
      })}
    </View>
  );
}

/** What the current tab shows. */
export function TabPanel({
  id,
  value,
  children,
}: {
  id: string;
  value: string;
  children: ReactNode;
}) {
  return (
    <View role="tabpanel" nativeID={`${id}-panel`} aria-labelledby={`${id}-${value}`}>
      {children}
    </View>
  );
}

export interface LinkTabsProps {
  /** Accessible name of the navigation, e.g. `Parts of this draft`. */
  label: string;
  tabs: readonly { href: string; label: string; after?: ReactNode }[];
  /** The href of the current page. */
  current: string;
  fill?: boolean;
}

/** The same row where each tab is a page with its own address. */
export function LinkTabs({ label, tabs, current, fill = false }: LinkTabsProps) {
  return (
    <View role="navigation" aria-label={label} style={styles.row}>
      {tabs.map((tab) => {
        const on = tab.href === current;
        return (
          <View key={tab.href} style={fill && styles.fill}>
            <RouterLink
              href={tab.href as Href}
              aria-current={on ? 'page' : undefined}
              style={linkTab}
              dataSet={{ focusInside: 'yes' }}
            >
              <TabFace on={on} label={tab.label} after={tab.after} />
            </RouterLink>
          </View>
        );
      })}
    </View>
  );
}

function TabFace({ on, label, after }: { on: boolean; label: string; after?: ReactNode }) {
  return (
    <>
      <Text tone={on ? 'blue' : 'ink2'} weight={on ? 700 : 400}>
        {label}
      </Text>
      {after}
      <View style={[styles.mark, on && styles.markOn]} aria-hidden />
    </>
  );
}

const box = {
  display: 'flex',
  flexDirection: 'row',
  alignItems: 'center',
  justifyContent: 'center',
  gap: 6,
  minHeight: touch.min,
  paddingLeft: 10,
  paddingRight: 10,
  cursor: 'pointer',
} as const;

const linkTab = webStyle({ ...box, textDecorationLine: 'none' });

const styles = StyleSheet.create({
  row: webStyle({
    display: 'flex',
    flexDirection: 'row',
    borderBottomWidth: line.thin,
    borderBottomColor: colour.ink,
    overflowX: 'auto',
    scrollbarWidth: 'none',
  }),
  tab: webStyle(box),
  fill: { flexGrow: 1, flexBasis: 0 },
  hovered: { backgroundColor: colour.well },
  mark: webStyle({
    position: 'absolute',
    left: '50%',
    bottom: 0,
    width: line.thin,
    height: 5,
    marginLeft: -0.5,
    backgroundColor: colour.ink,
  }),
  markOn: { width: line.thick, height: 10, marginLeft: -1.25, backgroundColor: colour.blue },
});
