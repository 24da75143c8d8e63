import { activateKeepAwakeAsync, deactivateKeepAwake } from 'expo-keep-awake';
import { useEffect } from 'react';

const tag = 'bench';

/** Keeps the screen on while a bench copy is open, where the browser lets it. */
export function useAwake(): void {
  useEffect(() => {
    const on = activateKeepAwakeAsync(tag).then(
      () => true,
      () => false,
    );
    return () => {
      void on.then((held) => (held ? deactivateKeepAwake(tag) : undefined)).catch(() => undefined);
    };
  }, []);
}
