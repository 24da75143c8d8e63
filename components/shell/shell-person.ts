import { createContext, useContext } from 'react';

export type ShellRole = 'viewer' | 'creator' | 'moderator' | 'admin';

/** What the shell shows of who is signed in. */
export interface ShellPerson {
  displayName: string;
  shopName: string | null;
  roles: readonly ShellRole[];
  /** Small numbers beside the places in the rail. */
  counts?: Partial<Record<'bench' | 'drafting' | 'cases' | 'you', number>>;
}

/** `undefined`: not known yet (pre-rendered page, no answer so far). `null`: nobody is signed in. */
const ShellPersonContext = createContext<ShellPerson | null | undefined>(undefined);

/** Wrap the shell with it; the account feature knows the person. */
export const ShellPersonProvider = ShellPersonContext.Provider;

export const useShellPerson = () => useContext(ShellPersonContext);

export const hasRole = (person: ShellPerson | null | undefined, role: ShellRole): boolean =>
  person?.roles.includes(role) ?? false;
