import { signUp } from '@embertally/shared/contracts/organisations';
import { defineRoute, type Route } from '../http/define-route.ts';
import type { AccountService } from '../services/account-service.ts';

export function organisationRoutes(accounts: AccountService): Route[] {
  return [
    defineRoute(signUp, async ({ body, trail }) => {
      await accounts.signUp(body, trail);
      return { kind: 'json', body: { accepted: true as const } };
    }),
  ];
}
