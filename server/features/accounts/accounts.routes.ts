import { done } from '#contracts/fields.ts';
import {
  changeAccount, changePassword, endOtherSessions, partGithub, readAccount, readJoining, readSession, signIn, signOut, signUp,
  signUpWithGithub, type ViewerView,
} from '#contracts/session.ts';
import type { Person } from '#server/entities/index.ts';
import type { Context } from '#server/http/context.ts';
import { handle, type EndpointTable } from '#server/http/endpoint-table.ts';
import { callerOf } from '#server/http/request-context.ts';
import { accountOf, changeProfile, checkSignIn, endOthers, openAccount, replacePassword } from './accounts.service.ts';
import { openGithubAccount, partGithubFrom } from './github.service.ts';

export { accountLimits } from './account-limits.ts';
export { accountsRouter } from './accounts-router.ts';

/** Signs somebody in under a new session, and says who they are. */
async function enter({ session, parts }: Context, person: Person): Promise<{ viewer: ViewerView }> {
  await session.signIn(person.id);
  return { viewer: callerOf(person, parts.now()) };
}

export function accountRoutes(table: EndpointTable): void {
  handle(table, readSession, async ({ viewer, parts: { config } }) => ({ viewer, demo: config.local, github: config.github !== null || config.local }));
  handle(table, signIn, async (context, { body }) => enter(context, await checkSignIn(context.em, body)));
  handle(table, signOut, async ({ session }) => {
    await session.signOut();
    return done;
  });
  handle(table, signUp, async (context, { body }) => enter(context, await openAccount(context.em, body)));
  handle(table, readJoining, async ({ session }) => ({ joining: session.joining }));
  handle(table, signUpWithGithub, async (context, { body }) =>
    enter(context, await openGithubAccount(context.em, context.session.joining, body, context.parts.now())));

  handle(table, readAccount, async ({ em, viewer, session, parts }) => accountOf(em, viewer, session.stored, parts.now()));
  handle(table, changeAccount, async ({ em, viewer }, { body }) => {
    await changeProfile(em, viewer, body);
    return done;
  });
  handle(table, changePassword, async ({ em, viewer, session }, { body }) => {
    await replacePassword(em, viewer, session.stored, body);
    await session.signIn(viewer.id);
    return done;
  });
  handle(table, partGithub, async ({ em, viewer }) => {
    await partGithubFrom(em, viewer);
    return done;
  });
  handle(table, endOtherSessions, async ({ em, viewer, session }) => ({ ended: await endOthers(em, viewer, session.stored) }));
}
