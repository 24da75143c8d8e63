import { useEffect, useId, type ReactNode } from 'react';
import { Modal, StyleSheet, View } from 'react-native';
import { PressArea } from './pressable';
import { Text } from './text';
import { VerdictShape } from './verdict';
import { colour, line } from './tokens';
import { webStyle } from './web-style';

export interface DialogAction {
  label: string;
  onPress: () => void;
  busy?: boolean;
  disabled?: boolean;
}

export interface DialogProps {
  open: boolean;
  /** The question, as a question. */
  title: string;
  /** Escape and the first action. */
  onClose: () => void;
  children?: ReactNode;
  /** Left: keeps things as they are. */
  keep?: string;
  /** Right: does it. `danger` carries the square. */
  action?: DialogAction & { danger?: boolean };
  /** Wider, for forms in a dialog. */
  wide?: boolean;
}

/** A flat dialog on the solid scrim. Focus stays in it and goes back to where it came from. */
export function Dialog({ open, ...props }: DialogProps) {
  return open ? <OpenDialog {...props} /> : null;
}

function OpenDialog(props: Omit<DialogProps, 'open'>) {
  const id = useId();
  usePageHeldStill();
  return (
    <Modal visible transparent onRequestClose={props.onClose} aria-labelledby={`${id}-title`}>
      <View style={styles.scrim}>
        <DialogFace {...props} titleId={`${id}-title`} />
      </View>
    </Modal>
  );
}

/** The dialog's drawing without the modal behaviour; the gallery shows it in place. */
export function DialogFace(props: Omit<DialogProps, 'open'> & { titleId?: string }) {
  const { title, titleId, children, keep = 'Keep it', action, onClose, wide } = props;
  return (
    <View style={[styles.box, wide && styles.wide]}>
      <View style={styles.body}>
        <Text role="heading" aria-level={2} size="lead" weight={700} nativeID={titleId}>
          {title}
        </Text>
        {typeof children === 'string' ? <Text tone="ink2">{children}</Text> : children}
      </View>
      <View style={styles.actions}>
        <DialogButton label={action ? keep : 'Close'} onPress={onClose} />
        {action ? (
          <DialogButton {...action} label={action.label} divided danger={action.danger} />
        ) : null}
      </View>
    </View>
  );
}

function DialogButton(props: DialogAction & { danger?: boolean; divided?: boolean }) {
  const { label, onPress, busy, disabled, danger, divided } = props;
  return (
    <PressArea
      role="button"
      label={label}
      labelledByContent
      onPress={busy ? undefined : onPress}
      disabled={disabled}
      aria-busy={busy}
      dataSet={{ focusInside: 'yes' }}
      style={(s) => [styles.button, divided && styles.divided, s.hovered && styles.hovered]}
    >
      {danger ? <VerdictShape kind="fails" size={12} /> : null}
      <Text weight={600} tone={disabled ? 'ink3' : danger ? 'failsText' : 'ink'} align="center">
        {label}
      </Text>
    </PressArea>
  );
}

/** The page behind doesn't scroll while something lies over it. */
export function usePageHeldStill(): void {
  useEffect(() => {
    const { style } = document.documentElement;
    const before = style.overflow;
    style.overflow = 'hidden';
    return () => {
      style.overflow = before;
    };
  }, []);
}

const styles = StyleSheet.create({
  scrim: webStyle({
    flex: 1,
    alignItems: 'center',
    justifyContent: 'center',
    padding: 22,
    backgroundColor: colour.scrim,
    overflowY: 'auto',
  }),
  box: webStyle({
    width: '100%',
    maxWidth: 480,
    borderWidth: line.medium,
    borderColor: colour.ink,
    backgroundColor: colour.film,
  }),
  wide: { maxWidth: 720 },
  body: { paddingVertical: 16, paddingHorizontal: 18, gap: 8 },
  actions: { flexDirection: 'row', borderTopWidth: line.thin, borderTopColor: colour.ink },
  button: webStyle({
    flex: 1,
    display: 'flex',
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'center',
    gap: 8,
    minHeight: 52,
    paddingLeft: 8,
    paddingRight: 8,
    cursor: 'pointer',
  }),
  divided: { borderLeftWidth: line.thin, borderLeftColor: colour.ink },
  hovered: { backgroundColor: colour.well },
});
