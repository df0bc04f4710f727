import type { SurveyOrder } from '#shared/survey-orders/contract.ts';
import { orderClocks } from '#shared/survey-orders/machine.ts';
import type { OrderStatus } from '#shared/survey-orders/machine.ts';

type Part = SurveyOrder['part'];

const words: Record<OrderStatus, Partial<Record<Part, string>> & { all: string }> = {
  'awaiting-payment': {
    all: 'It lapses if it is not paid.',
    buyer: 'Pay on the card page and the surveyor is asked. Nothing is charged before that.',
  },
  'awaiting-surveyor': {
    all: 'The surveyor has been asked.',
    surveyor: `Accept or decline within ${String(orderClocks.acceptHours)} hours; after that the money goes back.`,
    buyer: 'Your money is held. If the surveyor declines or does not answer, it comes back whole.',
  },
  arranging: {
    all: 'Surveyor and seller are agreeing a time.',
    surveyor: 'Propose times for the visit. The address is shown to you once the seller agrees one.',
    seller: 'The surveyor proposes times for the visit; you get a letter when they are here.',
  },
  arranged: { all: 'The visit is arranged.', surveyor: 'Begin the examination when you are at the boiler.' },
  examining: {
    all: 'The surveyor is at work. The report follows when it is signed.',
    surveyor: 'Go on with the examination; it saves as you go.',
  },
  'in-review': {
    all: 'The report is in and stands on the listing.',
    buyer: `Read the report. Accept it and the surveyor is paid; in ${String(orderClocks.reviewDays)} days that happens by itself.`,
    surveyor:
      'The buyer is reading the report. Your fee is released when it is accepted, or the review period ends.',
  },
  settling: {
    all: 'The fee is on its way to the surveyor.',
    surveyor: 'Your fee is being sent. If your payout account is not set up, it waits until it is.',
  },
  settled: { all: 'Nothing more is to be done.' },
  'refund-due': { all: 'The money is on its way back to the buyer’s card.' },
  refunded: { all: 'The money has gone back to the buyer’s card.' },
  cancelled: { all: 'Nothing was charged.' },
};

/** Once times are proposed it is the seller's turn. */
const proposedWords: Partial<Record<Part, string>> = {
  surveyor: 'The seller has your times and agrees one; the address is shown to you then.',
  seller: 'Agree one of the times the surveyor proposes.',
};

type Standing = Pick<SurveyOrder, 'status' | 'part' | 'proposedTimes'>;

/** What happens next, for this person. */
export function nextWords({ status, part, proposedTimes }: Standing): string {
  const proposed = status === 'arranging' && proposedTimes.length > 0 ? proposedWords[part] : undefined;
  return proposed ?? words[status][part] ?? words[status].all;
}
