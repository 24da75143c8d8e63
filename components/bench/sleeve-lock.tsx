import { useEffect, useRef, useState } from 'react';
import { Icon } from '../ui/icon';
import { IconButton } from '../ui/icon-button';
import { Text } from '../ui/text';
import { colour, line, touch } from '../ui/tokens';

const holdMs = 900;

export function LockButton({ onLock }: { onLock: () => void }) {
  return (
    <IconButton
      kind="bare"
      size="bench"
      icon="lock"
      label="Lock against a brush of the sleeve"
      onPress={onLock}
    />
  );
}

/**
 * Over everything while it is locked: a touch does nothing but a long hold of the bar, which a sleeve does not
 * make. Page keys and foot pedals go on working; a keyboard unlocks with Enter.
 */
export function SleeveLock({ onUnlock }: { onUnlock: () => void }) {
  const [held, setHeld] = useState(false);
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  const bar = useRef<HTMLButtonElement>(null);
  useEffect(() => {
    bar.current?.focus({ preventScroll: true });
    return () => clearTimeout(timer.current);
  }, []);
  const begin = () => {
    setHeld(true);
    timer.current = setTimeout(onUnlock, holdMs);
  };
  const end = () => {
    clearTimeout(timer.current);
    setHeld(false);
  };
  return (
    <div style={shield}>
      <button
        ref={bar}
        type="button"
        style={{ ...strip, ...(held ? down : {}) }}
        onPointerDown={begin}
        onPointerUp={end}
        onPointerLeave={end}
        onPointerCancel={end}
        onContextMenu={(event) => event.preventDefault()}
        // A press by keyboard or screen reader comes without a pointer.
        onClick={(event) => {
          if (event.detail === 0) onUnlock();
        }}
      >
        <Icon name="lock" size={28} tone={held ? 'film' : 'ink'} />
        <Text size="lead" weight={700} tone={held ? 'film' : 'ink'}>
          {held ? 'Keep holding' : 'Locked. Hold here to unlock'}
        </Text>
      </button>
    </div>
  );
}

const shield = {
  position: 'fixed',
  inset: 0,
  zIndex: 20,
  touchAction: 'none',
  display: 'flex',
  alignItems: 'flex-end',
} as const;
const strip = {
  display: 'flex',
  flexDirection: 'row',
  gap: 12,
  alignItems: 'center',
  justifyContent: 'center',
  width: '100%',
  minHeight: touch.benchPrimary + 24,
  border: 0,
  borderTop: `${line.thick}px solid ${colour.ink}`,
  background: colour.film,
  cursor: 'pointer',
  touchAction: 'none',
  userSelect: 'none',
} as const;
const down = { background: colour.ink } as const;
