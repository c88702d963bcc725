import { editMe, readCurrentSession, signIn, signOut } from '@embertally/shared/contracts/sessions';
import type { Sessions } from '../auth/sessions.ts';
import { deviceCookie, readDeviceCookie } from '../http/device-cookie.ts';
import { defineRoute, type Route } from '../http/define-route.ts';
import { Fault } from '../fault.ts';
import type { AccountService } from '../services/account-service.ts';

export function sessionRoutes(accounts: AccountService, sessions: Sessions): Route[] {
  return [
    defineRoute(signIn, async ({ body, trail, request }) => {
      const { me, token, deviceToken } = await accounts.signIn(body, readDeviceCookie(request), trail);
      return { kind: 'json', body: me, cookies: [sessions.cookie(token), deviceCookie(deviceToken)] };
    }),
    defineRoute(readCurrentSession, async ({ actor, signedIn }) => {
      if (signedIn === null) throw Fault.notFound();
      return { kind: 'json', body: await accounts.describe(actor.personId, actor.memberId, signedIn.expiresAt) };
    }),
    defineRoute(signOut, async ({ actor, signedIn, trail }) => {
      if (signedIn === null) throw Fault.notFound();
      await accounts.signOut(actor, signedIn.token, trail);
      return { kind: 'nothing', cookies: [sessions.blankCookie()], headers: { 'Clear-Site-Data': '"cache"' } };
    }),
    defineRoute(editMe, async ({ actor, signedIn, body }) => {
      if (signedIn === null) throw Fault.notFound();
      return { kind: 'json', body: await accounts.edit(actor, body, signedIn.expiresAt) };
    }),
  ];
}
