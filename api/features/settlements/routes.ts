import { Router } from 'express';
import { rawRoute } from '../../http/route.ts';
import * as service from './service.ts';

/** Mounted ahead of the JSON parser and of the origin check: the signature is over the bytes, and no browser sends it. */
export const paymentNoticeRoutes = Router();

rawRoute(
  paymentNoticeRoutes,
  { name: 'takePaymentNotice', method: 'POST', path: '/api/payments/notices' },
  async (ctx, request, response) => {
    const body: unknown = request.body;
    await service.takeNotice(
      ctx,
      Buffer.isBuffer(body) ? body : Buffer.alloc(0),
      request.get('stripe-signature') ?? '',
    );
    response.json({ received: true });
  },
);
