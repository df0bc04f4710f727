import { machine } from '../machine.ts';

export type OrderPart = 'buyer' | 'seller' | 'surveyor' | 'office' | 'system';

export const surveyOrderMachine = machine<OrderPart>()({
  'awaiting-payment': {
    pay: { to: 'awaiting-surveyor', by: ['system'] },
    cancel: { to: 'cancelled', by: ['buyer'] },
    lapse: { to: 'cancelled', by: ['system'] },
  },
  'awaiting-surveyor': {
    accept: { to: 'arranging', by: ['surveyor'] },
    decline: { to: 'refund-due', by: ['surveyor'] },
    cancel: { to: 'refund-due', by: ['buyer'] },
    lapse: { to: 'refund-due', by: ['system'] },
  },
  arranging: {
    proposeTimes: { to: 'arranging', by: ['surveyor'] },
    agreeTime: { to: 'arranged', by: ['seller'] },
    cancel: { to: 'refund-due', by: ['buyer', 'seller', 'surveyor'] },
  },
  arranged: {
    begin: { to: 'examining', by: ['surveyor'] },
    proposeTimes: { to: 'arranging', by: ['surveyor'] },
    cancel: { to: 'refund-due', by: ['buyer', 'seller', 'surveyor'] },
  },
  examining: {
    fileReport: { to: 'in-review', by: ['surveyor'] },
    abandon: { to: 'refund-due', by: ['surveyor'] },
  },
  'in-review': {
    acceptReport: { to: 'settling', by: ['buyer'] },
    endReview: { to: 'settling', by: ['system'] },
  },
  settling: {
    release: { to: 'settled', by: ['system'] },
  },
  'refund-due': {
    refund: { to: 'refunded', by: ['system'] },
  },
  settled: {},
  refunded: {},
  cancelled: {},
});

export type OrderStatus = (typeof surveyOrderMachine.states)[number];
export type OrderEvent = Parameters<typeof surveyOrderMachine.next>[1];

export const orderStatusLabels: Record<OrderStatus, string> = {
  'awaiting-payment': 'Waiting for payment',
  'awaiting-surveyor': 'Paid and held; waiting for the surveyor to accept',
  arranging: 'Accepted; a time is being agreed',
  arranged: 'Time agreed',
  examining: 'The surveyor is examining the boiler',
  'in-review': 'Report filed; the buyer is reading it',
  settling: 'Report accepted; the fee is being released',
  'refund-due': 'Cancelled; the money is on its way back',
  settled: 'Settled; the surveyor has been paid',
  refunded: 'Refunded in full',
  cancelled: 'Cancelled before payment',
};

/** What an order's record holds: its moves, and what happened without moving it. */
export type RecordedEvent = OrderEvent | 'place' | 'correctReport';

/** What the record says of an event, in the past tense. */
export const orderEventLabels: Record<RecordedEvent, string> = {
  place: 'Survey commissioned',
  pay: 'Paid; the money is held until the report is in',
  accept: 'Accepted by the surveyor',
  decline: 'Declined by the surveyor',
  lapse: 'Lapsed: not answered in time',
  proposeTimes: 'Times proposed by the surveyor',
  agreeTime: 'Time agreed by the seller',
  begin: 'Examination begun',
  abandon: 'Examination given up',
  fileReport: 'Report filed',
  correctReport: 'Report corrected by the surveyor',
  acceptReport: 'Report accepted by the buyer',
  endReview: 'Review period ended',
  release: 'Fee released to the surveyor',
  refund: 'Money returned to the buyer',
  cancel: 'Cancelled',
};

/** Clocks of an order. */
export const orderClocks = {
  /** Hours to pay before the order lapses. */
  payHours: 24,
  /** Hours for the surveyor to accept or decline. */
  acceptHours: 48,
  /** Days the buyer has to read the report before the fee is released. */
  reviewDays: 5,
} as const;

const correctable: ReadonlySet<OrderStatus> = new Set(['in-review', 'settling', 'settled']);

/** Whether the report of an order in this state may be corrected: it is in, and the order stands. */
export const mayCorrectReport = (status: OrderStatus): boolean => correctable.has(status);
