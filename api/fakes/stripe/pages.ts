import express, { Router } from 'express';
import { decline, faultsOf, outcomeOf, pay } from './cards.ts';
import type { Card, CardFaults } from './cards.ts';
import { escape, page, style } from './html.ts';
import type { Notices } from './notices.ts';
import type { Store, Thing } from './store.ts';

const sum = (session: Thing): string =>
  new Intl.NumberFormat('en-GB', {
    style: 'currency',
    currency: String(session['currency']).toUpperCase(),
  }).format(Number(session['amount_total']) / 100);

const titleOf = (session: Thing): string => (session['fake'] as { title: string }).title;

function field(name: keyof Card, label: string, card: Card, faults: CardFaults, hints: string): string {
  const fault = faults[name];
  return `<div><label for="${name}">${label}</label>
<input id="${name}" name="${name}" value="${escape(card[name])}" ${hints}${fault ? ` aria-invalid="true" aria-describedby="${name}-fault"` : ''}>
${fault ? `<span class="fault" id="${name}-fault">${escape(fault)}</span>` : ''}</div>`;
}

function cardPage(
  session: Thing,
  card: Card = { number: '', expiry: '', cvc: '' },
  faults: CardFaults = {},
  refusal = '',
): string {
  const cancel = typeof session['cancel_url'] === 'string' ? session['cancel_url'] : '';
  return page(
    `Pay ${sum(session)}`,
    `<p class="note">Demonstration card page. No money moves.</p>
<h1>Pay ${escape(sum(session))}</h1><p>${escape(titleOf(session))}</p>
${refusal ? `<p class="fault" role="alert">${escape(refusal)}</p>` : ''}
<form method="post" novalidate>
${field('number', 'Card number', card, faults, 'inputmode="numeric" autocomplete="off"')}
<div class="two">${field('expiry', 'Expiry, MM/YY', card, faults, 'inputmode="numeric" autocomplete="off"')}
${field('cvc', 'Security code', card, faults, 'inputmode="numeric" autocomplete="off"')}</div>
<div class="row"><button>Pay ${escape(sum(session))}</button>${cancel ? `<a class="button quiet" href="${escape(cancel)}">Go back without paying</a>` : ''}</div>
</form>
<div class="sheet note">4242 4242 4242 4242 pays · 4000 0000 0000 0002 is declined · 4000 0000 0000 9995 has no funds · 4000 0025 0000 3155 asks for authentication · 4000 0000 0000 0259 pays and is charged back</div>`,
  );
}

const authenticatePage = (session: Thing): string =>
  page(
    'Authorise the payment',
    `<p class="note">Demonstration of a bank’s own page. No money moves.</p>
<h1>Authorise ${escape(sum(session))}</h1><p>${escape(titleOf(session))}</p>
<form method="post" action="/pay/${session.id}/authorise"><div class="row">
<button name="answer" value="authorise">Authorise</button><button class="quiet" name="answer" value="refuse">Refuse</button></div></form>`,
  );

const successUrl = (session: Thing): string =>
  String(session['success_url']).replaceAll('{CHECKOUT_SESSION_ID}', session.id);

/** The hosted pages: the card, the bank's question, and the setting up of a payee's account. */
export function pages(store: Store, notices: Notices): Router {
  const router = Router();
  const gone = page(
    'Nothing to pay',
    '<h1>Nothing to pay here</h1><p>This payment is finished, has lapsed, or never was.</p>',
  );
  const openSession = (id: string): Thing | undefined => {
    const session = store.find('checkout.session', id);
    return session?.['status'] === 'open' ? session : undefined;
  };

  // Only here: the API's own bodies nest.
  router.use(['/pay', '/set-up'], express.urlencoded({ extended: false, limit: '10kb' }));
  router.get('/style.css', (_request, response) => {
    response.type('css').send(style);
  });
  router.get('/pay/:id', (request, response) => {
    const session = openSession(request.params.id);
    response.status(session ? 200 : 404).send(session ? cardPage(session) : gone);
  });
  router.post('/pay/:id', (request, response) => {
    const session = openSession(request.params.id);
    if (!session) {
      response.status(404).send(gone);
      return;
    }
    const typed = (request.body ?? {}) as Partial<Card>;
    const card = { number: typed.number ?? '', expiry: typed.expiry ?? '', cvc: typed.cvc ?? '' };
    const faults = faultsOf(card, new Date());
    if (Object.keys(faults).length > 0) {
      response.status(422).send(cardPage(session, card, faults));
      return;
    }
    const outcome = outcomeOf(card.number);
    const refusals = {
      declined: ['generic_decline', 'Your card has been declined.'],
      'no-funds': ['insufficient_funds', 'Your card has insufficient funds.'],
    } as const;
    if (outcome === 'declined' || outcome === 'no-funds') {
      const [code, message] = refusals[outcome];
      decline(store, notices, session, code, message);
      store.save();
      response.status(402).send(cardPage(session, { ...card, cvc: '' }, {}, message));
      return;
    }
    if (outcome === 'authenticate') {
      response.send(authenticatePage(session));
      return;
    }
    pay(store, notices, session, outcome);
    store.save();
    response.redirect(303, successUrl(session));
  });
  router.post('/pay/:id/authorise', (request, response) => {
    const session = openSession(request.params.id);
    if (!session) {
      response.status(404).send(gone);
      return;
    }
    if ((request.body as { answer?: string } | undefined)?.answer === 'authorise') {
      pay(store, notices, session, 'pays');
      store.save();
      response.redirect(303, successUrl(session));
      return;
    }
    decline(store, notices, session, 'authentication_required', 'The payment was not authorised.');
    store.save();
    response
      .status(402)
      .send(
        cardPage(session, undefined, {}, 'The payment was not authorised. Try again or use another card.'),
      );
  });
  router.get('/set-up/:id', (request, response) => {
    const account = store.find('account', request.params.id);
    response.status(account ? 200 : 404).send(
      account
        ? page(
            'Where fees are paid',
            `<p class="note">Demonstration set-up page. No account is opened.</p><h1>Where your fees are paid</h1>
<p>The real payment service asks for your name, address and bank account here.</p>
<form method="post"><div class="row"><button>Finish set-up</button></div></form>`,
          )
        : gone,
    );
  });
  router.post('/set-up/:id', (request, response) => {
    const account = store.find('account', request.params.id);
    if (!account) {
      response.status(404).send(gone);
      return;
    }
    Object.assign(account, { details_submitted: true, charges_enabled: true, payouts_enabled: true });
    notices.tell('account.updated', account);
    store.save();
    const back = account['fake_return_url'];
    response.redirect(303, typeof back === 'string' ? back : '/');
  });
  return router;
}
