import type { DeskItem } from '#shared/desk/contract.ts';
import { scopes } from '#shared/surveys/scopes.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { isBefore } from '#shared/time.ts';
import type { Instant } from '#shared/time.ts';
import type { Part, StoredOrder } from '../survey-orders/service.ts';

interface Todo {
  todo: string;
  why: string;
  path?: string;
  dueAt?: Instant | null;
}

function forBuyer({ status, dueAt }: StoredOrder, reportPath: string): Todo | undefined {
  if (status === 'awaiting-payment')
    return {
      todo: 'Pay for the survey',
      why: 'The surveyor is asked once you have paid; unpaid, it lapses.',
      dueAt,
    };
  if (status === 'in-review')
    return {
      todo: 'Read the report',
      why: 'When the time is over the fee is released to the surveyor.',
      path: reportPath,
      dueAt,
    };
  return undefined;
}

function forSeller(
  { status, proposedTimes }: StoredOrder,
  reportPath: string,
  now: Instant,
): Todo | undefined {
  if (status === 'arranging' && proposedTimes.some((at) => isBefore(now, at)))
    return {
      todo: 'Agree a time for the survey',
      why: 'The surveyor has proposed times. Your address is shown to them once you agree one.',
      dueAt: proposedTimes.at(-1) ?? null,
    };
  if (status === 'in-review')
    return {
      todo: 'Read the report on your boiler',
      why: 'It is attached to your listing.',
      path: reportPath,
    };
  return undefined;
}

function forSurveyor(order: StoredOrder, now: Instant): Todo | undefined {
  const { status, dueAt, appointmentAt, proposedTimes } = order;
  if (status === 'awaiting-surveyor')
    return {
      todo: 'Accept or decline a survey',
      why: 'Paid and held. Unanswered, it lapses and the money goes back.',
      dueAt,
    };
  if (status === 'arranging' && !proposedTimes.some((at) => isBefore(now, at)))
    return {
      todo: proposedTimes.length > 0 ? 'Propose new times' : 'Propose times for the visit',
      why:
        proposedTimes.length > 0
          ? 'The times you proposed have passed without one being agreed.'
          : 'The seller is waiting to hear when you could come.',
    };
  if (status === 'arranged')
    return {
      todo: 'Examine the boiler',
      why: 'A time is agreed; the address is with the order.',
      dueAt: appointmentAt,
    };
  if (status === 'examining')
    return {
      todo: 'Go on with the survey',
      why: 'Begun and not yet filed.',
      path: sitePaths.examination(order.id),
    };
  return undefined;
}

/** What an order asks of the person who plays this part in it; undefined where they can only wait. */
export function deskItemOf(
  order: StoredOrder,
  part: Part,
  now: Instant,
  reportId: string | undefined,
): DeskItem | undefined {
  const orderPath = sitePaths.order(order.id);
  const reportPath = reportId === undefined ? orderPath : sitePaths.report(reportId);
  const found =
    part === 'buyer'
      ? forBuyer(order, reportPath)
      : part === 'seller'
        ? forSeller(order, reportPath, now)
        : part === 'surveyor'
          ? forSurveyor(order, now)
          : undefined;
  if (!found) return undefined;
  return {
    id: `order-${order.id}`,
    todo: found.todo,
    about: `${order.listing.title} · ${scopes[order.scope].label}`,
    why: found.why,
    path: found.path ?? orderPath,
    dueAt: found.dueAt ?? null,
    since: order.movedAt,
  };
}
