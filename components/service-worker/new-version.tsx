import { usePathname } from 'expo-router';
import { useEffect, useSyncExternalStore } from 'react';
import { frameOf } from '../shell/places';
import { Banner } from '../ui/banner';
import { newVersionStore, startServiceWorker, takeNewVersion } from './registration';

/** Starts the service worker and offers a newer version; never in the middle of a step. */
export function NewVersion() {
  const path = usePathname();
  const state = useSyncExternalStore(
    newVersionStore.subscribe,
    newVersionStore.snapshot,
    () => 'none' as const,
  );
  useEffect(startServiceWorker, []);
  if (state === 'none' || frameOf(path) === 'bare') return null;
  return (
    <Banner kind="note" announce action={{ label: 'Load it', onPress: takeNewVersion }}>
      A new version is here. What you typed and did not keep goes when it loads.
    </Banner>
  );
}
