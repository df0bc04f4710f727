import type { Address } from '#shared/listings/draft.ts';
import { orderClocks } from '#shared/survey-orders/machine.ts';
import type { OrderEvent } from '#shared/survey-orders/machine.ts';
import { scopes } from '#shared/surveys/scopes.ts';
import { sitePaths } from '#shared/site-paths.ts';
import type { LetterJob } from '../../jobs/jobs.ts';
import { addressText, calendarFile } from './calendar.ts';
import type { Part, Parties } from './parties.ts';
import type { StoredOrder } from './repo.ts';
import { moneyText, timeText } from './words.ts';

/** What a letter about a move may say. The order is as it stands after the move. */
export interface Moved {
  event: OrderEvent;
  order: StoredOrder;
  parties: Parties;
  reason: string;
  publicUrl: string;
  /** Only for a time agreed: where, told to the seller and the surveyor. */
  address?: Address | null;
  /** Only for a time agreed: how often one has been. */
  timesAgreed?: number;
}

type Recipient = keyof Parties;

const pageOf = ({ order, publicUrl }: Moved): string => `${publicUrl}${sitePaths.order(order.id)}`;

function letterTo(
  to: Recipient,
  moved: Moved,
  subject: string,
  lines: readonly string[],
  attachments?: LetterJob['attachments'],
): LetterJob {
  const { name, email } = moved.parties[to];
  return {
    to: email,
    subject: `${subject}: ${moved.order.listing.title}`,
    text: `${name},\n\n${lines.join('\n\n')}\n\n${pageOf(moved)}`,
    ...(attachments ? { attachments } : {}),
  };
}

const because = ({ reason }: Moved): string[] => (reason === '' ? [] : [`The reason given: ${reason}`]);

const scopeText = ({ order }: Moved): string => scopes[order.scope].label;

function paid(moved: Moved): LetterJob[] {
  const { order } = moved;
  const lines = order.quotation.lines.map(({ label, amount }) => `  ${label}: ${moneyText(amount)}`);
  return [
    letterTo('buyer', moved, 'Paid and held', [
      `You have commissioned a survey (${scopeText(moved)}). Your money is held until the report is in and you have had time to read it.`,
      [...lines, `  Total: ${moneyText(order.total)}`].join('\n'),
      `The surveyor has ${String(orderClocks.acceptHours)} hours to accept. If nobody answers, the whole sum goes back to your card.`,
    ]),
    letterTo('surveyor', moved, 'A survey for you to accept', [
      `A buyer asks you for a survey (${scopeText(moved)}) and has paid. Your part is ${moneyText(order.quotation.surveyorPart)}.`,
      `Accept or decline before ${timeText(order.dueAt ?? order.movedAt)}. After that the money goes back.`,
    ]),
  ];
}

function agreed(moved: Moved): LetterJob[] {
  const { order, address = null } = moved;
  const startsAt = order.appointmentAt ?? order.movedAt;
  const parts: Recipient[] = ['buyer', 'seller', 'surveyor'];
  return parts.map((to) => {
    const knowsWhere = to !== 'buyer' && address !== null;
    const place = knowsWhere ? addressText(address) : '';
    const file = calendarFile({
      orderId: order.id,
      title: order.listing.title,
      scope: order.scope,
      startsAt,
      sequence: moved.timesAgreed ?? 0,
      place,
      url: pageOf(moved),
    });
    return letterTo(
      to,
      moved,
      'Time agreed for the survey',
      [
        `The survey (${scopeText(moved)}) is on ${timeText(startsAt)}.`,
        ...(knowsWhere ? [`Where: ${place}`] : []),
        ...(knowsWhere && address.accessNotes !== '' ? [`Getting in: ${address.accessNotes}`] : []),
        ...(to === 'seller' && order.scope !== 'external'
          ? [
              'Have the boiler cold, drained and where one can get round it. Water and a drain will be wanted.',
            ]
          : []),
        'The calendar file is attached.',
      ],
      [
        {
          filename: 'survey.ics',
          contentType: 'text/calendar; charset=utf-8',
          base64: Buffer.from(file).toString('base64'),
        },
      ],
    );
  });
}

/** Everybody concerned hears that a paid order has ended early, and the buyer that the money comes back. */
function ended(moved: Moved, subject: string, what: string, to: readonly Recipient[]): LetterJob[] {
  return to.map((one) =>
    letterTo(one, moved, subject, [
      what,
      ...because(moved),
      ...(one === 'buyer' ? [`${moneyText(moved.order.total)} is on its way back to your card.`] : []),
    ]),
  );
}

/** The letters that a move calls for; none says an address to anyone but the seller and the surveyor who is to come. */
export function lettersOf(moved: Moved, by: Part | 'system'): LetterJob[] {
  const { event, order } = moved;
  switch (event) {
    case 'pay':
      return paid(moved);
    case 'accept':
      return [
        letterTo('buyer', moved, 'The surveyor has accepted', [
          'The surveyor has accepted and will propose times to the seller.',
        ]),
        letterTo('seller', moved, 'A survey of your boiler', [
          `A buyer has commissioned a survey of your boiler (${scopeText(moved)}), and ${moved.parties.surveyor.name} has accepted it. You pay nothing.`,
          'You will be sent times to choose from. Your address is shown to the surveyor only once you have agreed one.',
        ]),
      ];
    case 'proposeTimes':
      return [
        letterTo('seller', moved, 'Times for the survey', [
          `${moved.parties.surveyor.name} proposes:`,
          order.proposedTimes.map((at) => `  ${timeText(at)}`).join('\n'),
          'Agree the one that suits you. The time agreed before, if there was one, no longer holds.',
        ]),
      ];
    case 'agreeTime':
      return agreed(moved);
    case 'decline':
      return ended(moved, 'The surveyor has declined', 'The surveyor cannot take the job.', ['buyer']);
    case 'lapse':
      return order.status === 'cancelled'
        ? [
            letterTo('buyer', moved, 'The survey was not paid for', [
              'Nothing was charged, and the commission has lapsed. You can place it again at any time.',
            ]),
          ]
        : ended(moved, 'The surveyor did not answer', 'The surveyor did not answer in time.', [
            'buyer',
            'surveyor',
          ]);
    case 'cancel':
      if (order.status === 'cancelled') return [];
      return ended(
        moved,
        'The survey is cancelled',
        `The ${by === 'system' ? 'office' : by} has cancelled the survey.`,
        order.proposedTimes.length > 0 || by === 'seller'
          ? ['buyer', 'seller', 'surveyor']
          : ['buyer', 'surveyor'],
      );
    case 'abandon':
      return ended(
        moved,
        'The examination was given up',
        'The surveyor began the examination and could not finish it.',
        ['buyer', 'seller', 'surveyor'],
      );
    case 'fileReport': {
      const onPaper = { withReportOfOrder: order.id };
      return [
        {
          ...letterTo('buyer', moved, 'The report is in', [
            `The surveyor has filed the report; it comes with this letter. Read it before ${timeText(order.dueAt ?? order.movedAt)}: then the fee is released, or earlier if you accept it.`,
            'It speaks of the day of examination only and is no certificate of safety.',
          ]),
          ...onPaper,
        },
        {
          ...letterTo('seller', moved, 'The report is in', [
            'The surveyor has filed the report on your boiler; it comes with this letter. It is attached to your listing.',
          ]),
          ...onPaper,
        },
      ];
    }
    case 'release':
      return [
        letterTo('surveyor', moved, 'Your fee has been sent', [
          `${moneyText(order.quotation.surveyorPart)} is on its way to your account.`,
        ]),
      ];
    case 'refund':
      return [
        letterTo('buyer', moved, 'Your money has been returned', [
          `${moneyText(order.total)} has been sent back to your card. Banks take a few days to show it.`,
        ]),
      ];
    case 'begin':
    case 'acceptReport':
    case 'endReview':
      break;
  }
  return [];
}

/** A corrected version of the report is in: the buyer and the seller get it, with the reason. */
export function correctionLetters(moved: Omit<Moved, 'event'>, version: number): LetterJob[] {
  const parts: Recipient[] = ['buyer', 'seller'];
  return parts.map((to) => ({
    ...letterTo(to, { ...moved, event: 'fileReport' }, 'The report has been corrected', [
      `The surveyor has corrected the report and signed it again. This is version ${String(version)}; it comes with this letter.`,
      ...because({ ...moved, event: 'fileReport' }),
      'The earlier version can still be read, and is marked as superseded.',
    ]),
    withReportOfOrder: moved.order.id,
  }));
}

/** To a buyer whose card was charged after the order had been given up. */
export const latePaymentLetter = (moved: Omit<Moved, 'event'>): LetterJob =>
  letterTo('buyer', { ...moved, event: 'refund' }, 'Your payment came too late', [
    `The commission had been given up when your card was charged. The whole ${moneyText(moved.order.total)} goes back to it.`,
  ]);
