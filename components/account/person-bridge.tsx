import { useMemo, type ReactNode } from 'react';
import { useMe } from '../data/me-queries';
import { useOutbox } from '../data/outbox-hooks';
import { ShellPersonProvider, type ShellPerson } from '../shell/shell-person';

/** Tells the shell who is signed in. */
export function PersonBridge({ children }: { children: ReactNode }) {
  const { me, known, failed } = useMe();
  const waiting = useOutbox().length;
  const person = useMemo<ShellPerson | null | undefined>(() => {
    if (!me) return known || failed ? null : undefined;
    return {
      displayName: me.displayName,
      shopName: me.shopName,
      roles: me.roles,
      counts: {
        ...(waiting ? { bench: waiting } : {}),
        ...(me.openCases ? { cases: me.openCases } : {}),
      },
    };
  }, [me, known, failed, waiting]);
  return <ShellPersonProvider value={person}>{children}</ShellPersonProvider>;
}
