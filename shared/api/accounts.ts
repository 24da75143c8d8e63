import { z } from 'zod';
import { id, idParams, okSchema, pageOf, pageQuery, personRefSchema, timestamp } from './common';
import { contract } from './contract';
import { limits } from './limits';

export const roles = ['viewer', 'creator', 'moderator', 'admin'] as const;
export type Role = (typeof roles)[number];
const role = z.enum(roles);

const email = z.email('That is not an e-mail address.').max(limits.email);
const password = z
  .string()
  .min(limits.passwordMin, 'Twelve characters or more. A phrase is fine.')
  .max(limits.passwordMax);
const displayName = z
  .string()
  .trim()
  .min(1, 'A name others see is needed.')
  .max(limits.displayName);

/** How figures are shown to a person; also kept in the browser for those signed out. */
const preferenceShape = {
  units: z.enum(['mm', 'in']),
  inchGrid: z.union([z.literal(16), z.literal(32), z.literal(64)]),
  terms: z.enum(['us', 'uk']),
  theme: z.enum(['system', 'day', 'night']),
  hand: z.enum(['right', 'left']),
};
export const preferencesSchema = z.object({
  units: preferenceShape.units.default('mm'),
  inchGrid: preferenceShape.inchGrid.default(32),
  terms: preferenceShape.terms.default('us'),
  theme: preferenceShape.theme.default('system'),
  hand: preferenceShape.hand.default('right'),
});
/** A change of some of them; without defaults, so that the rest stays as it was. */
const preferenceChange = z.object(preferenceShape).partial();
export type Preferences = z.infer<typeof preferencesSchema>;

/** The signed-in person, with what they may do (the same abilities the server enforces). */
export const meSchema = z.object({
  id,
  handle: z.string(),
  displayName: z.string(),
  shopName: z.string().nullable(),
  email: z.string(),
  emailConfirmed: z.boolean(),
  roles: z.array(role),
  preferences: preferencesSchema,
  abilities: z.object({
    talk: z.boolean(),
    becomeCreator: z.boolean(),
    draft: z.boolean(),
    moderate: z.boolean(),
    administer: z.boolean(),
  }),
  openCases: z.number().int().nullable(),
  createdAt: timestamp,
});
export type Me = z.infer<typeof meSchema>;

export const sessionSchema = z.object({
  id: z.string(),
  current: z.boolean(),
  device: z.string(),
  createdAt: timestamp,
  lastSeenAt: timestamp,
});
export type SessionView = z.infer<typeof sessionSchema>;

export const signUpBody = z.object({
  email,
  password,
  displayName,
  units: z.enum(['mm', 'in']).default('mm'),
  acceptTerms: z.literal(true, 'Please read and accept the terms and the safety notice.'),
});
export const signInBody = z.object({
  email,
  password: z.string().min(1, 'Type your password.').max(limits.passwordMax),
});
export const newPasswordBody = z.object({ token: z.string().min(10).max(200), password });
export const profileBody = z.object({
  displayName: displayName.optional(),
  shopName: z.string().trim().max(limits.shopName).nullable().optional(),
  preferences: preferenceChange.optional(),
});

export const getMe = contract({
  id: 'getMe',
  method: 'GET',
  path: '/me',
  access: 'public',
  summary: 'Who is signed in, or null.',
  response: z.object({ me: meSchema.nullable() }),
});
export const signUp = contract({
  id: 'signUp',
  method: 'POST',
  path: '/accounts',
  access: 'public',
  limit: 'sign-in',
  status: 201,
  summary: 'Make an account; the answer is the same whether the e-mail is known or not.',
  body: signUpBody,
  response: okSchema,
});
export const confirmEmail = contract({
  id: 'confirmEmail',
  method: 'POST',
  path: '/accounts/confirm',
  access: 'public',
  limit: 'sign-in',
  summary: 'Confirm an e-mail address with the token from the letter.',
  body: z.object({ token: z.string().min(10).max(200) }),
  response: okSchema,
});
export const resendConfirmation = contract({
  id: 'resendConfirmation',
  method: 'POST',
  path: '/accounts/resend',
  access: 'person',
  limit: 'mail',
  summary: 'Send the confirming letter again.',
  response: okSchema,
});
export const signIn = contract({
  id: 'signIn',
  method: 'POST',
  path: '/sessions',
  access: 'public',
  limit: 'sign-in',
  summary: 'Sign in with e-mail and password.',
  body: signInBody,
  response: z.object({ me: meSchema }),
});
export const signOut = contract({
  id: 'signOut',
  method: 'DELETE',
  path: '/sessions/current',
  access: 'person',
  status: 204,
  summary: 'Sign out of this session.',
});
export const listSessions = contract({
  id: 'listSessions',
  method: 'GET',
  path: '/sessions',
  access: 'person',
  summary: 'Where one is signed in.',
  response: z.object({ items: z.array(sessionSchema) }),
});
export const endSession = contract({
  id: 'endSession',
  method: 'DELETE',
  path: '/sessions/:sessionId',
  access: 'person',
  status: 204,
  summary: 'End one of one’s sessions.',
  params: z.object({ sessionId: z.string().max(200) }),
});
export const askReset = contract({
  id: 'askReset',
  method: 'POST',
  path: '/accounts/reset',
  access: 'public',
  limit: 'mail',
  summary: 'Ask for a letter to set a new password; the answer is always the same.',
  body: z.object({ email }),
  response: okSchema,
});
export const setPassword = contract({
  id: 'setPassword',
  method: 'POST',
  path: '/accounts/password',
  access: 'public',
  limit: 'sign-in',
  summary: 'Set a new password with the token from the letter; ends all sessions.',
  body: newPasswordBody,
  response: okSchema,
});
export const updateProfile = contract({
  id: 'updateProfile',
  method: 'PATCH',
  path: '/me',
  access: 'person',
  limit: 'write',
  summary: 'Change name, shop name and preferences.',
  body: profileBody,
  response: z.object({ me: meSchema }),
});
export const becomeCreator = contract({
  id: 'becomeCreator',
  method: 'POST',
  path: '/me/creator',
  access: 'confirmed',
  limit: 'write',
  summary: 'Accept the publishing rules and become a creator.',
  body: z.object({ acceptRules: z.literal(true, 'Please read and accept the publishing rules.') }),
  response: z.object({ me: meSchema }),
});

export const adminPersonSchema = personRefSchema.extend({
  email: z.string(),
  emailConfirmed: z.boolean(),
  roles: z.array(role),
  suspendedUntil: timestamp.nullable(),
  createdAt: timestamp,
});
export const listPeople = contract({
  id: 'listPeople',
  method: 'GET',
  path: '/admin/people',
  access: 'admin',
  summary: 'Find people by name or e-mail.',
  query: pageQuery.extend({ q: z.string().max(120).default('') }),
  response: pageOf(adminPersonSchema),
});
export const setRoles = contract({
  id: 'setRoles',
  method: 'PUT',
  path: '/admin/people/:personId/roles',
  access: 'admin',
  limit: 'write',
  summary: 'Grant and take roles; logged.',
  params: idParams('personId'),
  body: z.object({ roles: z.array(role) }),
  response: adminPersonSchema,
});

export const accountContracts = [
  getMe,
  signUp,
  confirmEmail,
  resendConfirmation,
  signIn,
  signOut,
  listSessions,
  endSession,
  askReset,
  setPassword,
  updateProfile,
  becomeCreator,
  listPeople,
  setRoles,
] as const;
