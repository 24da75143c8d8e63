import { useEffect, useSyncExternalStore } from 'react';
import { StyleSheet, View } from 'react-native';
import { PressArea } from './pressable';
import { Text } from './text';
import { colour, layer } from './tokens';
import { VisuallyHidden } from './visually-hidden';
import { webStyle } from './web-style';

export interface ToastMessage {
  text: string;
  /** Undo and the like. The toast stays longer with one. */
  action?: { label: string; onPress: () => void };
}

interface Said {
  polite: string;
  assertive: string;
  toast: (ToastMessage & { id: number }) | null;
}

let said: Said = { polite: '', assertive: '', toast: null };
let count = 0;
const listeners = new Set<() => void>();

function say(change: Partial<Said>): void {
  said = { ...said, ...change };
  listeners.forEach((changed) => changed());
}

/** Reads a sentence out. The same sentence twice is read twice. */
export function announce(text: string, how: 'polite' | 'assertive' = 'polite'): void {
  count += 1;
  // A no-break space at the end makes a repeated sentence a change of the live region.
  say({ [how]: text + (count % 2 ? '\u00a0' : '') });
}

/** Shows a bar at the foot of the page for a while and reads it out. A new one takes the old one's place. */
export function toast(message: ToastMessage | string): void {
  const m = typeof message === 'string' ? { text: message } : message;
  count += 1;
  say({ toast: { ...m, id: count } });
  announce(m.text);
}

/** Takes the bar away; with an id only if it is still that one. */
export function dismissToast(id?: number): void {
  if (id === undefined || said.toast?.id === id) say({ toast: null });
}

const subscribe = (changed: () => void) => {
  listeners.add(changed);
  return () => {
    listeners.delete(changed);
  };
};
const silent: Said = { polite: '', assertive: '', toast: null };
const useSaid = () =>
  useSyncExternalStore(
    subscribe,
    () => said,
    () => silent,
  );

/** Milliseconds a toast stays: long enough to read, and to reach its action with a keyboard. */
const stays = { plain: 6000, withAction: 12_000 } as const;

/** The live regions and the toast bar; once, in the root layout. */
export function Announcer() {
  const { polite, assertive, toast: shown } = useSaid();
  useEffect(() => {
    if (!shown) return undefined;
    const timer = setTimeout(
      () => dismissToast(shown.id),
      shown.action ? stays.withAction : stays.plain,
    );
    return () => clearTimeout(timer);
  }, [shown]);
  return (
    <>
      <VisuallyHidden role="status" aria-live="polite">
        {polite}
      </VisuallyHidden>
      <VisuallyHidden role="alert" aria-live="assertive">
        {assertive}
      </VisuallyHidden>
      {shown ? (
        <ToastBar key={shown.id} message={shown} onDismiss={() => dismissToast(shown.id)} fixed />
      ) : null}
    </>
  );
}

/** The bar's drawing; the gallery shows it in place. */
export function ToastBar(props: { message: ToastMessage; onDismiss: () => void; fixed?: boolean }) {
  const { message, onDismiss, fixed } = props;
  const { action } = message;
  return (
    <View style={[styles.bar, fixed && styles.fixed]} dataSet={{ print: 'no' }}>
      <Text size="note" tone="film" style={styles.words}>
        {message.text}
      </Text>
      <ToastPress
        label={action ? action.label : 'Close'}
        onPress={() => {
          onDismiss();
          action?.onPress();
        }}
      />
    </View>
  );
}

function ToastPress({ label, onPress }: { label: string; onPress: () => void }) {
  return (
    <PressArea
      role="button"
      label={label}
      labelledByContent
      onPress={onPress}
      dataSet={{ onInk: 'yes' }}
      style={styles.press}
    >
      <Text size="note" weight={700} tone="film" style={styles.underline}>
        {label}
      </Text>
    </PressArea>
  );
}

const styles = StyleSheet.create({
  bar: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: 12,
    minHeight: 52,
    paddingLeft: 16,
    paddingRight: 6,
    backgroundColor: colour.ink,
  },
  fixed: webStyle({
    position: 'fixed',
    left: 16,
    right: 16,
    bottom: 'calc(76px + env(safe-area-inset-bottom, 0px))',
    maxWidth: 560,
    marginLeft: 'auto',
    marginRight: 'auto',
    zIndex: layer.toast,
    borderWidth: 1.5,
    borderColor: colour.film,
  }),
  words: { flexGrow: 1, flexShrink: 1, paddingVertical: 8 },
  press: webStyle({
    minHeight: 48,
    justifyContent: 'center',
    paddingLeft: 12,
    paddingRight: 12,
    cursor: 'pointer',
  }),
  underline: webStyle({ textDecorationLine: 'underline', textUnderlineOffset: 3 }),
});
