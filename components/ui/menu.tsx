import { useState, type ReactNode } from 'react';
import { Modal, StyleSheet, View } from 'react-native';
import { arrowKeys } from './arrow-keys';
import { Icon, type IconName } from './icon';
import { PressArea } from './pressable';
import { Text } from './text';
import { VerdictShape } from './verdict';
import { colour, line, touch } from './tokens';
import { webStyle } from './web-style';

export interface MenuItem {
  label: string;
  onPress: () => void;
  icon?: IconName;
  /** Carries the square and stands last. */
  danger?: boolean;
  disabled?: boolean;
  /** Carries a tick: the one in force. */
  chosen?: boolean;
}

interface TriggerProps {
  onPress: () => void;
  expanded: boolean;
  hasPopup: 'menu';
}

export interface MenuProps {
  /** Accessible name of the list. */
  label: string;
  items: readonly MenuItem[];
  /** Draws the button that opens it, e.g. `(t) => <IconButton icon="more" label="More" {...t} />`. */
  trigger: (props: TriggerProps) => ReactNode;
}

interface Place {
  top?: number;
  bottom?: number;
  right?: number;
  left?: number;
}

/** A list of actions under a button. Arrows move, Enter and Space do it, Escape closes. */
export function Menu({ label, items, trigger }: MenuProps) {
  const [anchor, setAnchor] = useState<View | null>(null);
  const [place, setPlace] = useState<Place | null>(null);
  const close = () => setPlace(null);
  const open = () => setPlace(placeBelow(anchor as unknown as HTMLElement | null));
  return (
    <View ref={setAnchor} style={styles.anchor}>
      {trigger({ onPress: open, expanded: place !== null, hasPopup: 'menu' })}
      {place ? (
        <Modal visible transparent onRequestClose={close} aria-label={label}>
          <View style={styles.ground} onClick={close}>
            <View style={[styles.list, place]} onClick={(event) => event.stopPropagation()}>
              <MenuList label={label} items={items} onDone={close} />
            </View>
          </View>
        </Modal>
      ) : null}
    </View>
  );
}

/** Under the button, over it where there is no room, on the side that keeps it on screen. */
function placeBelow(element: HTMLElement | null): Place {
  if (!element) return { top: 0, left: 0 };
  const box = element.getBoundingClientRect();
  const { innerWidth, innerHeight } = window;
  return {
    ...(box.bottom > innerHeight * 0.6
      ? { bottom: innerHeight - box.top + 4 }
      : { top: box.bottom + 4 }),
    ...(box.left > innerWidth / 2 ? { right: innerWidth - box.right } : { left: box.left }),
  };
}

interface MenuListProps extends Pick<MenuProps, 'label' | 'items'> {
  onDone: () => void;
}

/** The open list; the gallery shows it in place. */
export function MenuList({ label, items, onDone }: MenuListProps) {
  return (
    <View role="menu" aria-label={label}>
      {items.map((item, index) => (
        <PressArea
          key={item.label}
          role="menuitem"
          label={item.label}
          labelledByContent
          disabled={item.disabled}
          tabIndex={index === 0 ? 0 : -1}
          onPress={() => {
            onDone();
            item.onPress();
          }}
          onKeyDown={(event) =>
            arrowKeys(event, { group: 'menu', item: 'menuitem', axis: 'column' })
          }
          dataSet={{ focusInside: 'yes' }}
          style={(s) => [
            styles.item,
            index > 0 && styles.ruled,
            s.hovered && styles.hovered,
            item.chosen && styles.chosen,
          ]}
        >
          {item.icon ? (
            <Icon name={item.icon} size={20} tone={item.disabled ? 'ink3' : 'ink'} />
          ) : null}
          {item.danger ? <VerdictShape kind="fails" size={12} /> : null}
          <Text
            weight={item.chosen ? 600 : 400}
            tone={item.disabled ? 'ink3' : item.danger ? 'failsText' : 'ink'}
            style={styles.words}
          >
            {item.label}
          </Text>
          {item.chosen ? <Icon name="tick" size={20} tone="blue" /> : null}
        </PressArea>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  anchor: { alignSelf: 'flex-start' },
  ground: { flex: 1 },
  list: webStyle({
    position: 'fixed',
    minWidth: 220,
    maxWidth: 'calc(100vw - 32px)',
    maxHeight: '70vh',
    overflowY: 'auto',
    borderWidth: line.medium,
    borderColor: colour.ink,
    backgroundColor: colour.sheet,
  }),
  item: webStyle({
    display: 'flex',
    flexDirection: 'row',
    alignItems: 'center',
    gap: 10,
    minHeight: touch.min,
    paddingLeft: 12,
    paddingRight: 12,
    cursor: 'pointer',
  }),
  ruled: { borderTopWidth: line.thin, borderTopColor: colour.ruleThin },
  hovered: { backgroundColor: colour.well },
  chosen: webStyle({
    backgroundColor: colour.blueWash,
    boxShadow: `inset 2.5px 0 0 ${colour.blue}`,
  }),
  words: { flexGrow: 1, flexShrink: 1 },
});
