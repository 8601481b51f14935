import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { emailText, handleText, noBody, nothing, ok, personName } from './fields.ts';
import { roles } from './words.ts';

export const viewerView = z.object({ handle: z.string(), name: z.string(), role: z.enum(roles), suspended: z.boolean() });
export type ViewerView = z.output<typeof viewerView>;

/** Who is looking, and what the site offers them. */
export const readSession = endpoint({
  method: 'GET', path: '/api/session', access: 'anyone', params: nothing, query: nothing, body: noBody,
  reply: z.object({
    viewer: viewerView.nullable(), demo: z.boolean(),
    /** Whether GitHub can be signed in with here. */
    github: z.boolean(),
  }),
});
export type SessionView = z.output<typeof readSession.reply>;

export const signIn = endpoint({
  method: 'POST', path: '/api/session', access: 'anyone', params: nothing, query: nothing,
  body: z.object({ email: z.string().trim().toLowerCase().min(1, 'Give your e-mail address.').max(254), password: z.string().min(1, 'Give your password.').max(200) }),
  reply: z.object({ viewer: viewerView }),
});
export const signOut = endpoint({
  method: 'DELETE', path: '/api/session', access: 'anyone', params: nothing, query: nothing, body: noBody, reply: ok,
});

export const passwordText = z.string().min(10, 'Ten letters or more.').max(200, 'Two hundred letters at most.');
export const signUp = endpoint({
  method: 'POST', path: '/api/accounts', access: 'anyone', params: nothing, query: nothing,
  body: z.object({ name: personName, handle: handleText, email: emailText, password: passwordText }),
  reply: z.object({ viewer: viewerView }),
});

/** A GitHub account nobody here has, on its way to becoming an account of ours. */
export const readJoining = endpoint({
  method: 'GET', path: '/api/accounts/joining', access: 'anyone', params: nothing, query: nothing, body: noBody,
  reply: z.object({ joining: z.object({ name: z.string(), handle: z.string(), email: z.string() }).nullable() }),
});
export type JoiningView = z.output<typeof readJoining.reply>;
/** Finishes a sign-up begun at GitHub; the address is the one GitHub has confirmed. */
export const signUpWithGithub = endpoint({
  method: 'POST', path: '/api/accounts/github', access: 'anyone', params: nothing, query: nothing,
  body: z.object({ name: personName, handle: handleText }), reply: z.object({ viewer: viewerView }),
});

export const readAccount = endpoint({
  method: 'GET', path: '/api/account', access: 'member', params: nothing, query: nothing, body: noBody,
  reply: z.object({
    handle: z.string(), name: z.string(), about: z.string(), email: z.string(), github: z.boolean(), password: z.boolean(),
    sessions: z.array(z.object({ current: z.boolean(), since: z.string() })),
  }),
});
export type AccountView = z.output<typeof readAccount.reply>;
export const changeAccount = endpoint({
  method: 'PATCH', path: '/api/account', access: 'member', params: nothing, query: nothing,
  body: z.object({ name: personName.optional(), about: z.string().trim().max(1000, 'A thousand letters at most.').optional() }), reply: ok,
});
/** Ends every other session. `current` may be empty only for an account without a password. */
export const changePassword = endpoint({
  method: 'POST', path: '/api/account/password', access: 'member', params: nothing, query: nothing,
  body: z.object({ current: z.string().max(200), password: passwordText }), reply: ok,
});
export const partGithub = endpoint({
  method: 'DELETE', path: '/api/account/github', access: 'member', params: nothing, query: nothing, body: noBody, reply: ok,
});
/** Signs this person out everywhere but here. */
export const endOtherSessions = endpoint({
  method: 'DELETE', path: '/api/account/sessions', access: 'member', params: nothing, query: nothing, body: noBody,
  reply: z.object({ ended: z.number().int() }),
});
