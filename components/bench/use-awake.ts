import { activateKeepAwakeAsync, deactivateKeepAwake } from 'expo-keep-awake';
import { useEffect, useState } from 'react';

const tag = 'bench';

/** Keeps the screen on while a bench copy is open. False when the browser refuses; null until it has answered. */
export function useAwake(): boolean | null {
  const [on, setOn] = useState<boolean | null>(null);
  useEffect(() => {
    let gone = false;
    const hold = () => {
      // A browser lets go when the page is out of sight.
      if (document.visibilityState !== 'visible') return;
      void activateKeepAwakeAsync(tag).then(
        () => {
          if (gone) void deactivateKeepAwake(tag).catch(() => undefined);
          else setOn(true);
        },
        () => {
          if (!gone) setOn(false);
        },
      );
    };
    hold();
    document.addEventListener('visibilitychange', hold);
    return () => {
      gone = true;
      document.removeEventListener('visibilitychange', hold);
      void deactivateKeepAwake(tag).catch(() => undefined);
    };
  }, []);
  return on;
}
