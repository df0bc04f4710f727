import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { routeTable } from '#api/http/route.ts';
import * as photos from '#api/features/photos/service.ts';
import { demoAccounts } from '#api/demo-accounts.ts';
import { emptyRecord } from '#shared/surveys/record.ts';
import { rubricVersion } from '#shared/surveys/rubric/index.ts';
import { scoreSurvey } from '#shared/surveys/score.ts';
import { addDays, addHours, dayOf } from '#shared/time.ts';
import { workings } from '#shared/workings/contract.ts';
import { file, givenExamination, givenRecorded } from '#tests/support/examinations.ts';
import { completeDraft, givenListing, tinyPicture } from '#tests/support/factories.ts';
import {
  act,
  arrange,
  givenPaidOrder,
  givenPlacedOrder,
  givenSurveyor,
  surveyorTerms,
} from '#tests/support/orders.ts';
import { anEngine } from '#tests/support/engines.ts';
import { givenSite } from '#tests/support/site.ts';
import type { Site, TestPerson } from '#tests/support/site.ts';

/** Who asks, in the order of the columns below. */
const askers = ['visitor', 'stranger', 'seller', 'buyer', 'surveyor', 'other surveyor', 'office'] as const;
type Asker = (typeof askers)[number];

/** `in`: authorised, whatever the operation then says of its state or input. Otherwise the refusal. */
type Expected = 'in' | 401 | 403 | 404;
type Columns = readonly [Expected, Expected, Expected, Expected, Expected, Expected, Expected];

type Cast = Record<'seller' | 'buyer' | 'surveyor', TestPerson>;
interface Call {
  cast: Cast;
  method: 'get' | 'post' | 'put' | 'patch' | 'delete';
  path: string;
  body?: object;
}

const everyone: Columns = ['in', 'in', 'in', 'in', 'in', 'in', 'in'];
const members: Columns = [401, 'in', 'in', 'in', 'in', 'in', 'in'];
const officeOnly: Columns = [401, 403, 403, 403, 403, 403, 'in'];
const surveyorsOnly: Columns = [401, 403, 403, 403, 'in', 'in', 403];
const sellerOnly: Columns = [401, 404, 'in', 404, 404, 404, 404];
const notTheSeller: Columns = [401, 'in', 403, 'in', 'in', 'in', 'in'];
const parties: Columns = [401, 404, 'in', 'in', 'in', 404, 'in'];
const buyerAlone: Columns = [401, 404, 403, 'in', 403, 404, 403];
const surveyorAlone: Columns = [401, 404, 403, 403, 'in', 404, 403];
const sellerAlone: Columns = [401, 404, 'in', 403, 403, 404, 403];
const surveyorOfIt: Columns = [401, 404, 404, 404, 'in', 404, 404];
const sellerOfReport: Columns = [401, 403, 'in', 403, 403, 403, 403];
const machineOnly: Columns = ['in', 'in', 'in', 'in', 'in', 'in', 'in'];

async function world(site: Site) {
  const stranger = await site.givenPerson('Nan Ridley');
  const office = await site.givenPerson('Olive Crane', 'office');
  const otherSurveyor = await givenSurveyor(site);
  const placed = await givenPlacedOrder(site);
  const paid = await givenPaidOrder(site);
  const paidToo = await givenPaidOrder(site);
  const accepted = await givenPaidOrder(site);
  await act(site, accepted.surveyor, accepted.orderId, 'accept').expect(200);
  const proposed = await givenPaidOrder(site);
  const startsAt = addHours(site.clock.now(), 30);
  await act(site, proposed.surveyor, proposed.orderId, 'accept').expect(200);
  await act(site, proposed.surveyor, proposed.orderId, 'times', { times: [startsAt] }).expect(200);
  const arranged = await givenPaidOrder(site);
  await arrange(site, arranged);
  const examining = await givenExamination(site);
  const abandoning = await givenPaidOrder(site);
  await arrange(site, abandoning);
  await act(site, abandoning.surveyor, abandoning.orderId, 'begin').expect(200);
  const reviewed = await givenExamination(site);
  const recorded = await givenRecorded(site, reviewed);
  const filed = (await file(site, reviewed.surveyor, recorded)).body as { id: string; checkCode: string };

  const draft = (await site.as(placed.seller).post('/api/listings').send({}).expect(201)).body as {
    id: string;
    version: number;
  };
  const owner = site.ctxAs({ ...placed.seller, isEmailVerified: true, roles: new Set(), sessionId: 'test' });
  const buffer = await tinyPicture();
  const words = {
    ownerId: placed.seller.id,
    listingId: draft.id,
    view: 'whole',
    alt: 'A boiler',
    filename: 'a.jpg',
  };
  const shown = await photos.addPhotoFromBuffer(owner, { ...words, buffer });
  const doomed = await photos.addPhotoFromBuffer(owner, { ...words, buffer });
  const paper = await photos.addDocumentFromBuffer(owner, {
    ownerId: placed.seller.id,
    listingId: draft.id,
    filename: 'paper.jpg',
    buffer,
  });
  const spare = await givenListing(site, placed.seller);
  return {
    stranger,
    office,
    otherSurveyor,
    placed,
    paid,
    paidToo,
    accepted,
    proposed,
    startsAt,
    arranged,
    examining,
    abandoning,
    reviewed,
    filed,
    draft,
    shown,
    doomed,
    paper,
    spare,
  };
}
type World = Awaited<ReturnType<typeof world>>;

const facts = completeDraft().facts;
const empty = emptyRecord(rubricVersion);
const score = () => ({ facts, scope: 'external', record: empty });
const signOff = (at: string) => ({
  name: 'Isobel Tarn',
  signedAt: at,
  independent: true,
  limitsUnderstood: true,
});
const of = (cast: Cast, method: Call['method'], path: string, body?: object): Call => ({
  cast,
  method,
  path,
  ...(body ? { body } : {}),
});
const order = (
  trade: Cast & { orderId: string },
  method: Call['method'],
  rest: string,
  body?: object,
): Call => of(trade, method, `/api/survey-orders/${trade.orderId}${rest}`, body);
const reason = { reason: 'For this test' };

type Row = [call: (made: World, site: Site) => Call, columns: Columns];

/** Every route, how it is called, and what each asker gets. A route that is missing here fails the test. */
const table: Record<string, Row> = {
  getMe: [({ placed }) => of(placed, 'get', '/api/me'), everyone],
  updateMe: [({ placed }) => of(placed, 'patch', '/api/me', {}), members],
  skipEnrolment: [({ placed }) => of(placed, 'post', '/api/me/skip-enrolment', {}), members],
  getSite: [({ placed }) => of(placed, 'get', '/api/site'), everyone],
  listLetters: [({ placed }) => of(placed, 'get', '/api/letters'), everyone],
  searchTowns: [({ placed }) => of(placed, 'get', '/api/towns?q=heb'), everyone],
  createListing: [({ placed }) => of(placed, 'post', '/api/listings', {}), members],
  listListings: [({ placed }) => of(placed, 'get', '/api/listings'), everyone],
  listOwnListings: [({ placed }) => of(placed, 'get', '/api/my/listings'), members],
  getListing: [({ placed }) => of(placed, 'get', `/api/listings/${placed.listing.slug}`), everyone],
  getOwnListing: [({ placed, draft }) => of(placed, 'get', `/api/my/listings/${draft.id}`), sellerOnly],
  saveListing: [
    ({ placed, draft }) =>
      of(placed, 'put', `/api/my/listings/${draft.id}`, { version: draft.version, draft: completeDraft() }),
    sellerOnly,
  ],
  moveListing: [
    ({ placed, draft }) => of(placed, 'post', `/api/my/listings/${draft.id}/moves`, { event: 'publish' }),
    sellerOnly,
  ],
  orderPhotos: [
    ({ placed, draft }) => of(placed, 'put', `/api/my/listings/${draft.id}/photo-order`, { photoIds: [] }),
    sellerOnly,
  ],
  updatePhoto: [
    ({ placed, shown }) => of(placed, 'patch', `/api/photos/${shown.id}`, { alt: 'A boiler' }),
    sellerOnly,
  ],
  getPhotoVariant: [
    ({ placed, shown }) => of(placed, 'get', `/media/${shown.id}/480.jpeg`),
    [404, 404, 'in', 404, 404, 404, 'in'],
  ],
  getDocument: [
    ({ placed, paper }) => of(placed, 'get', `/api/documents/${paper.id}`),
    [401, 404, 'in', 404, 404, 404, 'in'],
  ],
  deletePhoto: [({ placed, doomed }) => of(placed, 'delete', `/api/photos/${doomed.id}`), sellerOnly],
  deleteDocument: [({ placed, paper }) => of(placed, 'delete', `/api/documents/${paper.id}`), sellerOnly],
  uploadFile: [({ placed }) => of(placed, 'post', '/api/files', {}), members],
  quoteSurvey: [
    ({ placed, spare }) =>
      of(placed, 'post', `/api/listings/${spare.id}/survey-quotes`, { scope: 'external', extras: [] }),
    notTheSeller,
  ],
  placeSurveyOrder: [
    ({ placed, spare }) =>
      of(placed, 'post', '/api/survey-orders', {
        listingId: spare.id,
        surveyorId: 'nobody',
        scope: 'external',
        extras: [],
        expectedTotal: { minor: 1, currency: 'GBP' },
        beginsWithinCancellationPeriod: true,
      }),
    notTheSeller,
  ],
  listSurveyOrders: [({ placed }) => of(placed, 'get', '/api/survey-orders'), members],
  getSurveyOrder: [({ arranged }) => order(arranged, 'get', ''), parties],
  payForSurvey: [({ placed }) => order(placed, 'post', '/checkout', {}), buyerAlone],
  checkPayment: [({ placed }) => order(placed, 'post', '/payment-check', {}), buyerAlone],
  acceptSurveyOrder: [({ paid }) => order(paid, 'post', '/accept', {}), surveyorAlone],
  declineSurveyOrder: [({ paidToo }) => order(paidToo, 'post', '/decline', reason), surveyorAlone],
  proposeTimes: [
    ({ accepted, startsAt }) => order(accepted, 'post', '/times', { times: [startsAt] }),
    surveyorAlone,
  ],
  agreeTime: [({ proposed, startsAt }) => order(proposed, 'post', '/agree', { startsAt }), sellerAlone],
  getCalendarFile: [({ arranged }) => order(arranged, 'get', '/calendar.ics'), parties],
  beginSurvey: [({ arranged }) => order(arranged, 'post', '/begin', {}), surveyorAlone],
  cancelSurveyOrder: [
    ({ accepted }) => order(accepted, 'post', '/cancel', reason),
    [401, 404, 'in', 'in', 'in', 404, 403],
  ],
  abandonSurvey: [({ abandoning }) => order(abandoning, 'post', '/abandon', reason), surveyorAlone],
  getSurvey: [({ examining }) => order(examining, 'get', '/survey'), [401, 404, 404, 404, 'in', 404, 'in']],
  saveSurvey: [
    ({ examining }) => order(examining, 'put', '/survey', { version: 99, record: empty }),
    surveyorOfIt,
  ],
  fileSurvey: [
    ({ examining }, site) =>
      order(examining, 'post', '/survey/file', {
        version: 99,
        signOff: signOff(site.clock.now()),
        result: scoreSurvey({ facts: facts as never, record: empty, scope: 'full' }),
      }),
    surveyorOfIt,
  ],
  acceptReport: [({ reviewed }) => order(reviewed, 'post', '/accept-report', {}), buyerAlone],
  printReport: [({ reviewed, filed }) => of(reviewed, 'get', `/api/reports/${filed.id}/pdf`), everyone],
  getReport: [({ reviewed, filed }) => of(reviewed, 'get', `/api/reports/${filed.id}`), everyone],
  getReportAgreements: [
    ({ reviewed, filed }) => of(reviewed, 'get', `/api/reports/${filed.id}/agreements`),
    everyone,
  ],
  getReportVersions: [
    ({ reviewed, filed }) => of(reviewed, 'get', `/api/reports/${filed.id}/versions`),
    everyone,
  ],
  startCorrection: [
    ({ reviewed, filed }) =>
      of(reviewed, 'post', `/api/reports/${filed.id}/corrections`, { reason: 'A figure was misread.' }),
    [401, 403, 403, 403, 'in', 403, 403],
  ],
  giveUpCorrection: [({ reviewed }) => order(reviewed, 'delete', '/survey/correction'), surveyorOfIt],
  getReportReplies: [
    ({ reviewed, filed }) => of(reviewed, 'get', `/api/reports/${filed.id}/replies`),
    everyone,
  ],
  replyToFinding: [
    ({ reviewed, filed }) =>
      of(reviewed, 'post', `/api/reports/${filed.id}/replies`, {
        criterionId: 'safety.glass',
        text: 'Cleaned since.',
      }),
    sellerOfReport,
  ],
  listRepair: [
    ({ reviewed, filed }, site) =>
      of(reviewed, 'post', `/api/reports/${filed.id}/repairs`, {
        text: 'Water gauge cleaned.',
        doneOn: dayOf(site.clock.now()),
      }),
    sellerOfReport,
  ],
  checkReport: [({ reviewed, filed }) => of(reviewed, 'get', `/api/checks/${filed.checkCode}`), everyone],
  getMethod: [({ placed }) => of(placed, 'get', '/api/method'), everyone],
  scoreBySurveyMethod: [({ placed }) => of(placed, 'post', '/api/method/score', score()), everyone],
  listEngines: [({ placed }) => of(placed, 'get', '/api/engines'), members],
  keepEngine: [({ placed }) => of(placed, 'post', '/api/engines', anEngine), members],
  // Kept by nobody of the cast: to every member it is not there.
  changeEngine: [
    ({ placed }) => of(placed, 'put', `/api/engines/${randomUUID()}`, anEngine),
    [401, 404, 404, 404, 404, 404, 404],
  ],
  forgetEngine: [
    ({ placed }) => of(placed, 'delete', `/api/engines/${randomUUID()}`),
    [401, 404, 404, 404, 404, 404, 404],
  ],
  listWorkings: [({ placed }) => of(placed, 'get', '/api/workings'), everyone],
  ...Object.fromEntries(
    workings.map(({ calculator, endpoint }): [string, Row] => [
      endpoint.name,
      [({ placed }) => of(placed, 'post', endpoint.path, { inputs: calculator.initial }), everyone],
    ]),
  ),
  getMySurveyorTerms: [({ placed }) => of(placed, 'get', '/api/my/surveyor-terms'), surveyorsOnly],
  saveMySurveyorTerms: [
    ({ placed }, site) =>
      of(
        placed,
        'put',
        '/api/my/surveyor-terms',
        surveyorTerms({ insuredUntilOn: dayOf(addDays(site.clock.now(), 200)) }),
      ),
    surveyorsOnly,
  ],
  startPayoutSetUp: [({ placed }) => of(placed, 'post', '/api/my/payout-set-up', {}), surveyorsOnly],
  getDesk: [({ placed }) => of(placed, 'get', '/api/desk'), members],
  listOfficeOrders: [({ placed }) => of(placed, 'get', '/api/office/orders'), officeOnly],
  getOfficeMoney: [({ placed }) => of(placed, 'get', '/api/office/money'), officeOnly],
  listLedger: [({ placed }) => of(placed, 'get', '/api/office/ledger'), officeOnly],
  listAudit: [({ placed }) => of(placed, 'get', '/api/office/audit'), officeOnly],
  listMembers: [({ placed }) => of(placed, 'get', '/api/office/members'), officeOnly],
  changeRole: [
    ({ placed, stranger }) =>
      of(placed, 'post', `/api/office/members/${stranger.id}/roles`, {
        role: 'surveyor',
        change: 'withdraw',
        ...reason,
      }),
    officeOnly,
  ],
  moveListingByOffice: [
    ({ placed, spare }) =>
      of(placed, 'post', `/api/office/listings/${spare.id}/moves`, { event: 'takeDown', ...reason }),
    officeOnly,
  ],
  // A machine calls it; who is signed in does not matter, the signature does.
  takePaymentNotice: [({ placed }) => of(placed, 'post', '/api/payments/notices', {}), machineOnly],
};

const classOf = (status: number): Expected =>
  status === 401 || status === 403 || status === 404 ? status : 'in';

describe('who may do what', () => {
  let site: Site;
  let made: World;
  beforeAll(async () => {
    site = await givenSite();
    made = await world(site);
  }, 240_000);
  afterAll(() => site.close());

  const personOf = (asker: Asker, cast: Cast): TestPerson | undefined => {
    const people: Record<Asker, TestPerson | undefined> = {
      visitor: undefined,
      stranger: made.stranger,
      'other surveyor': made.otherSurveyor,
      office: made.office,
      ...cast,
    };
    return people[asker];
  };

  test('the table names every route and no other', () => {
    expect(Object.keys(table).toSorted()).toEqual(
      [...new Set(routeTable.map(({ name }) => name))].toSorted(),
    );
  });

  test.each(Object.entries(table))('%s', async (_name, [callOf, columns]) => {
    const { cast, method, path, body } = callOf(made, site);
    // Those who are refused first: an operation that works may change what the next asker finds.
    const asked = askers.map((asker, index) => ({ asker, expected: columns[index]! }));
    const inOrder = asked.toSorted((a, b) => Number(a.expected === 'in') - Number(b.expected === 'in'));
    const found: Record<string, Expected> = {};
    for (const { asker } of inOrder) {
      const request = site.as(personOf(asker, cast))[method](path);
      const { status } = await (body ? request.send(body) : request);
      expect(status).not.toBe(500);
      found[asker] = classOf(status);
      // What is thrown away by the first who may is not there for the second.
      if (method === 'delete' && found[asker] === 'in') break;
    }
    const wanted = Object.fromEntries(
      asked.filter(({ asker }) => asker in found).map(({ asker, expected }) => [asker, expected]),
    );
    expect(found).toEqual(wanted);
  });

  test('a stranger cannot tell a record that is not theirs from one that is not there', async () => {
    const real = await site.as(made.stranger).get(`/api/survey-orders/${made.paid.orderId}`);
    const none = await site.as(made.stranger).get(`/api/survey-orders/${randomUUID()}`);
    const { instance: _a, ...one } = real.body as Record<string, unknown>;
    const { instance: _b, ...other } = none.body as Record<string, unknown>;
    expect(real.status).toBe(404);
    expect(one).toEqual(other);
  });

  test('a change that comes from another site is refused whoever is signed in', async () => {
    const { status, body } = await site
      .as(made.stranger)
      .patch('/api/me')
      .set('Origin', 'https://elsewhere.example')
      .send({});
    expect(status).toBe(403);
    expect((body as { type: string }).type).toMatch(/wrong-origin$/);
  });

  test('demonstration accounts are four, one for each part', () => {
    expect(new Set(demoAccounts.map(({ email }) => email)).size).toBe(4);
  });
});
