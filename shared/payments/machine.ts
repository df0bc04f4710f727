import { machine } from '../machine.ts';

/** The money of one order. Only the payment service's notices and our own jobs move it. */
export const paymentMachine = machine<'system'>()({
  'awaiting-card': {
    hold: { to: 'held', by: ['system'] },
    expire: { to: 'expired', by: ['system'] },
  },
  held: {
    startRelease: { to: 'releasing', by: ['system'] },
    startRefund: { to: 'refunding', by: ['system'] },
  },
  releasing: { release: { to: 'released', by: ['system'] } },
  refunding: { refund: { to: 'refunded', by: ['system'] } },
  /** Paid after the order had been cancelled: it can only go back. */
  expired: { holdLate: { to: 'refunding', by: ['system'] } },
  released: {},
  refunded: {},
});

export type PaymentStatus = (typeof paymentMachine.states)[number];
export type PaymentEvent = Parameters<typeof paymentMachine.next>[1];

export const paymentStatusLabels: Record<PaymentStatus, string> = {
  'awaiting-card': 'Waiting for the card',
  held: 'Held',
  releasing: 'Being released',
  released: 'Released to the surveyor',
  refunding: 'Being returned',
  refunded: 'Returned to the buyer',
  expired: 'Not paid',
};
