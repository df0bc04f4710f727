import { z } from 'zod';
import { role } from '../accounts/roles.ts';
import { byId, endpoint } from '../endpoint.ts';
import { money } from '../money.ts';
import { page, pageQuery } from '../paging.ts';
import { orderStatus } from '../survey-orders/contract.ts';
import { instant } from '../time.ts';

export const officeOrder = z.object({
  id: z.uuid(),
  status: orderStatus,
  listingTitle: z.string(),
  listingSlug: z.string(),
  buyer: z.string(),
  seller: z.string(),
  surveyor: z.string(),
  total: money,
  held: money,
  placedAt: instant,
  movedAt: instant,
});

export const listOfficeOrders = endpoint({
  name: 'listOfficeOrders',
  summary: 'All survey orders, the longest unmoved first',
  method: 'GET',
  path: '/api/office/orders',
  query: z.strictObject({ status: orderStatus.optional() }),
  response: z.object({ items: z.array(officeOrder) }),
});

export const ledgerEntry = z.object({
  id: z.int(),
  at: instant,
  what: z.string(),
  orderId: z.uuid(),
  lines: z.array(z.object({ account: z.string(), amount: money })),
});

export const getOfficeMoney = endpoint({
  name: 'getOfficeMoney',
  summary: 'Balances of the ledger, what the processor says, and whether they agree',
  method: 'GET',
  path: '/api/office/money',
  response: z.object({
    balances: z.array(z.object({ account: z.string(), label: z.string(), balance: money })),
    held: money,
    /** What the ledger says the processor holds for us. */
    processorByLedger: money,
    /** What the processor itself says; null if it did not answer. */
    processorByItself: money.nullable(),
    agrees: z.boolean().nullable(),
  }),
});

export const listLedger = endpoint({
  name: 'listLedger',
  summary: 'Ledger entries, newest first',
  method: 'GET',
  path: '/api/office/ledger',
  query: pageQuery,
  response: page(ledgerEntry),
});

export const auditEntry = z.object({
  id: z.string(),
  at: instant,
  who: z.string(),
  what: z.string(),
  subject: z.string(),
  subjectPath: z.string().nullable(),
  reason: z.string(),
});

export const listAudit = endpoint({
  name: 'listAudit',
  summary: 'Everything that moved, by whom and why, newest first',
  method: 'GET',
  path: '/api/office/audit',
  query: pageQuery,
  response: page(auditEntry),
});

export const officeMember = z.object({
  id: z.string(),
  name: z.string(),
  email: z.string(),
  roles: z.array(role),
  joinedAt: instant,
});

export const listMembers = endpoint({
  name: 'listMembers',
  summary: 'Members by name or e-mail',
  method: 'GET',
  path: '/api/office/members',
  query: z.strictObject({ q: z.string().trim().max(80).default('') }),
  response: z.object({ items: z.array(officeMember) }),
});

const reason = z
  .string()
  .trim()
  .min(3, 'Give a reason in a few words')
  .max(400, 'Keep it under 400 characters');

export const changeRole = endpoint({
  name: 'changeRole',
  summary: 'Grant or withdraw a role',
  method: 'POST',
  path: '/api/office/members/:id/roles',
  params: z.strictObject({ id: z.string().min(1).max(64) }),
  body: z.strictObject({ role, change: z.enum(['grant', 'withdraw']), reason }),
  response: officeMember,
});

export const moveListingByOffice = endpoint({
  name: 'moveListingByOffice',
  summary: 'Take a listing down, or put it back',
  method: 'POST',
  path: '/api/office/listings/:id/moves',
  params: byId,
  body: z.strictObject({ event: z.enum(['takeDown', 'restore']), reason }),
  response: z.object({ status: z.string() }),
});
