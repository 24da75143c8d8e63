import { type Href } from 'expo-router';
import { type IconName } from '../ui/icon';
import { hasRole, type ShellPerson, type ShellRole } from './shell-person';

export type PlaceKey = 'plans' | 'bench' | 'drafting' | 'shop-card' | 'you' | 'cases';

export interface Place {
  key: PlaceKey;
  label: string;
  icon: IconName;
  href: Extract<Href, string>;
  /** Only for people with this role. */
  role?: ShellRole;
  /** On a phone it is found under You instead. */
  railOnly?: boolean;
  /** Addresses that belong to it besides its own. */
  also?: RegExp;
}

/** Where one can go, in order. */
export const places: readonly Place[] = [
  { key: 'plans', label: 'Plans', icon: 'plans', href: '/', also: /^\/plans(\/|$)/ },
  { key: 'bench', label: 'Bench', icon: 'bench', href: '/bench', also: /^\/aids(\/|$)/ },
  { key: 'drafting', label: 'Drafting', icon: 'drafting', href: '/drafting', role: 'creator' },
  { key: 'shop-card', label: 'Shop card', icon: 'shopcard', href: '/shop-card' },
  {
    key: 'you',
    label: 'You',
    icon: 'you',
    href: '/you',
    also: /^\/(sign-in|sign-up|confirm|reset|new-password)(\/|$)/,
  },
  {
    key: 'cases',
    label: 'Cases',
    icon: 'cases',
    href: '/cases',
    role: 'moderator',
    railOnly: true,
  },
];

/** The places a person sees. */
export function placesFor(person: ShellPerson | null | undefined): Place[] {
  return places.filter((p) => !p.role || hasRole(person, p.role) || hasRole(person, 'admin'));
}

/** The place an address belongs to. */
export function placeOf(pathname: string): PlaceKey | undefined {
  return places.find(
    (p) =>
      p.also?.test(pathname) ||
      p.href === pathname ||
      (p.href !== '/' && pathname.startsWith(`${p.href}/`)),
  )?.key;
}

export type ShellFrame = 'full' | 'narrow' | 'bare';

/**
 * How much of the shell an address gets: drafting a rail of icons, a bench copy nothing at all
 * (its own bars and the stick), everything else the full rail and the tab bar.
 */
export function frameOf(pathname: string): ShellFrame {
  if (/^\/bench\/[^/]+/.test(pathname)) return 'bare';
  if (/^\/drafting\/[^/]+/.test(pathname)) return 'narrow';
  return 'full';
}
