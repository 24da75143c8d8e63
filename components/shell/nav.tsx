import { Link as RouterLink, usePathname } from 'expo-router';
import { StyleSheet, View } from 'react-native';
import { Icon } from '../ui/icon';
import { Mark } from '../ui/mark';
import { Text } from '../ui/text';
import { colour, layer, line } from '../ui/tokens';
import { VisuallyHidden } from '../ui/visually-hidden';
import { webStyle } from '../ui/web-style';
import { placeOf, placesFor, type Place, type ShellFrame } from './places';
import { useShellPerson, type ShellPerson } from './shell-person';

/** The rail at the left: words from 1024 px on, icons only before and in drafting. */
export function Rail({ frame }: { frame: ShellFrame }) {
  const person = useShellPerson();
  const here = placeOf(usePathname());
  return (
    <View
      role="navigation"
      aria-label="Places"
      dataSet={{ rail: frame, print: 'no' }}
      style={styles.rail}
    >
      <RouterLink href="/" aria-label="Scantling, to the plans" style={brand}>
        <Mark size={24} />
        <View dataSet={{ rail: 'words' }}>
          <Text size="lead" weight={700} style={styles.name}>
            Scantling
          </Text>
        </View>
      </RouterLink>
      {placesFor(person).map((place) => (
        <RailLink key={place.key} place={place} on={place.key === here} person={person} />
      ))}
      <View style={styles.push} />
      <View dataSet={{ rail: 'words' }} style={styles.foot}>
        <RailFoot person={person} />
      </View>
    </View>
  );
}

interface PlaceLinkProps {
  place: Place;
  on: boolean;
  person: ShellPerson | null | undefined;
}

const countOf = ({ place, person }: PlaceLinkProps) =>
  place.key in (person?.counts ?? {}) ? person?.counts?.[place.key as 'bench'] : undefined;

function RailLink(props: PlaceLinkProps) {
  const { place, on } = props;
  const count = countOf(props);
  return (
    <RouterLink
      href={place.href}
      aria-current={on ? 'page' : undefined}
      style={railLink}
      dataSet={{ rail: 'link', focusInside: 'yes' }}
    >
      <Icon name={place.icon} size={22} tone={on ? 'blue' : 'ink2'} />
      <View dataSet={{ rail: 'words' }} style={styles.label}>
        <Text size="note" tone={on ? 'blue' : 'ink2'} weight={on ? 700 : 400}>
          {place.label}
        </Text>
      </View>
      {count ? (
        <View dataSet={{ rail: 'words' }} style={styles.count}>
          <Text size="small" mono tone={on ? 'blue' : 'ink2'} weight={on ? 700 : 400}>
            {count}
          </Text>
        </View>
      ) : null}
      <View style={[styles.mark, on && styles.markOn]} aria-hidden />
    </RouterLink>
  );
}

function RailFoot({ person }: { person: ShellPerson | null | undefined }) {
  if (!person) return null;
  return (
    <Text size="small" tone="ink2">
      {person.shopName ? `${person.shopName}\n` : ''}Signed in as {person.displayName}
    </Text>
  );
}

/** The tab bar at the foot of a phone; a mark above the current tab. */
export function TabBar() {
  const person = useShellPerson();
  const here = placeOf(usePathname());
  const shown = placesFor(person).filter((p) => !p.railOnly);
  const current = here === 'cases' ? 'you' : here;
  return (
    <View
      role="navigation"
      aria-label="Places"
      dataSet={{ show: 'phone', print: 'no' }}
      style={styles.tabs}
    >
      {shown.map((place) => (
        <TabLink key={place.key} place={place} on={place.key === current} person={person} />
      ))}
    </View>
  );
}

function TabLink(props: PlaceLinkProps) {
  const { place, on } = props;
  const count = countOf(props);
  return (
    <RouterLink
      href={place.href}
      aria-current={on ? 'page' : undefined}
      style={tabLink}
      dataSet={{ focusInside: 'yes' }}
    >
      <View style={[styles.tick, on && styles.tickOn]} aria-hidden />
      <Icon name={place.icon} size={22} tone={on ? 'blue' : 'ink2'} />
      <Text style={styles.tabWord} tone={on ? 'blue' : 'ink2'} weight={on ? 700 : 400}>
        {place.label}
        {count ? <VisuallyHidden>, {count}</VisuallyHidden> : null}
      </Text>
    </RouterLink>
  );
}

const brand = webStyle({
  display: 'flex',
  flexDirection: 'row',
  alignItems: 'center',
  gap: 8,
  height: 40,
  paddingLeft: 16,
  paddingRight: 16,
  marginBottom: 16,
  textDecorationLine: 'none',
});
const railLink = webStyle({
  display: 'flex',
  flexDirection: 'row',
  alignItems: 'center',
  gap: 12,
  minHeight: 44,
  paddingLeft: 16,
  paddingRight: 16,
  textDecorationLine: 'none',
});
const tabLink = webStyle({
  flex: 1,
  minWidth: 0,
  display: 'flex',
  flexDirection: 'column',
  alignItems: 'center',
  gap: 2,
  minHeight: 58,
  paddingTop: 11,
  paddingBottom: 8,
  textDecorationLine: 'none',
});

const styles = StyleSheet.create({
  rail: webStyle({
    paddingTop: 16,
    paddingBottom: 12,
    borderRightWidth: line.medium,
    borderRightStyle: 'solid',
    borderRightColor: colour.ink,
    backgroundColor: colour.film,
    overflowY: 'auto',
    zIndex: layer.bar,
  }),
  name: { letterSpacing: -0.2 },
  push: { flexGrow: 1 },
  foot: { paddingHorizontal: 16 },
  label: { flexGrow: 1, flexShrink: 1 },
  count: { marginRight: 14 },
  mark: webStyle({
    position: 'absolute',
    right: 0,
    top: '50%',
    height: line.thin,
    width: 8,
    backgroundColor: colour.ink,
  }),
  markOn: { width: 20, height: line.thick, marginTop: -1, backgroundColor: colour.blue },
  tabs: webStyle({
    display: 'flex',
    flexDirection: 'row',
    borderTopWidth: line.medium,
    borderTopStyle: 'solid',
    borderTopColor: colour.ink,
    backgroundColor: colour.film,
    position: 'sticky',
    bottom: 0,
    zIndex: layer.bar,
    paddingBottom: 'env(safe-area-inset-bottom, 0px)',
  }),
  tick: webStyle({
    position: 'absolute',
    top: 0,
    left: '50%',
    width: line.thin,
    marginLeft: -0.5,
    height: 5,
    backgroundColor: colour.ink,
  }),
  tickOn: { width: line.thick, marginLeft: -1.25, height: 9, backgroundColor: colour.blue },
  tabWord: { fontSize: 13, lineHeight: 16 },
});
