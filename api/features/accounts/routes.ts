import { Router } from 'express';
import * as contract from '#shared/accounts/contract.ts';
import { platformChargeBasisPoints } from '#shared/survey-orders/pricing.ts';
import { Problem } from '#shared/problem.ts';
import { demoAccounts } from '../../demo-accounts.ts';
import type { Letters } from '../../deps.ts';
import { route } from '../../http/route.ts';
import * as service from './service.ts';

/** @param letters the fake post office's letters; absent where real mail is sent. */
export function accountRoutes(letters: Letters | undefined): Router {
  const router = Router();

  route(router, contract.getMe, async (ctx) => ({ me: await service.getMe(ctx) }));

  route(router, contract.updateMe, (ctx, { body }) => service.updateMe(ctx, body));

  route(router, contract.skipEnrolment, async (ctx) => {
    await service.skipEnrolment(ctx);
    return { done: true as const };
  });

  route(router, contract.getSite, (ctx) => ({
    isDemo: ctx.site.isDemo,
    demoAccounts: ctx.site.isDemo ? [...demoAccounts] : [],
    platformChargePercent: platformChargeBasisPoints / 100,
  }));

  route(router, contract.listLetters, async (ctx, { query }) => {
    if (!ctx.site.isDemo || !letters) throw new Problem('not-found');
    const items = await letters.list();
    return { items: query.to ? items.filter((letter) => letter.to === query.to) : items };
  });

  return router;
}
