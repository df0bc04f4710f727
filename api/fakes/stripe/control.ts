import express, { Router } from 'express';
import { escape, page } from './html.ts';
import type { Notices } from './notices.ts';
import type { Store } from './store.ts';

const button = (path: string, label: string) =>
  `<form method="post" action="/control/${path}"><button class="quiet">${label}</button></form>`;

/** A desk where a person or a test holds, releases, reorders, repeats and drops the stand-in's notices. */
export function control(store: Store, notices: Notices): Router {
  const router = Router();
  const view = () => ({
    mode: store.state.mode,
    deliveries: store.state.deliveries.map((delivery) => ({
      ...delivery,
      type: String(store.state.things[delivery.eventId]?.['type']),
    })),
  });

  router.use('/control', express.urlencoded({ extended: false }), express.json());
  router.get('/control/state', (_request, response) => {
    response.json(view());
  });
  router.get('/control', (_request, response) => {
    const { mode, deliveries } = view();
    const rows = deliveries
      .toReversed()
      .map(
        ({ eventId, type, state, attempts }) =>
          `<tr><td>${escape(type)}</td><td>${state}</td><td>${String(attempts)}</td><td>${button(`repeat/${eventId}`, 'Send again')}</td></tr>`,
      )
      .join('');
    response.send(
      page(
        'Notices',
        `<p class="note">Demonstration payment service</p><h1>Notices</h1>
<p>New notices are now: <strong>${{ send: 'sent at once', hold: 'held back', drop: 'dropped' }[mode]}</strong>.</p>
<div class="row">${button('mode/send', 'Send at once')}${button('mode/hold', 'Hold back')}${button('mode/drop', 'Drop')}${button('release', 'Release what is held')}${button('release-reversed', 'Release in reverse order')}</div>
<div class="scroll"><table><thead><tr><th>Notice</th><th>State</th><th>Tries</th><th></th></tr></thead><tbody>${rows}</tbody></table></div>`,
        true,
      ),
    );
  });
  router.post('/control/mode/:mode', (request, response) => {
    const { mode } = request.params;
    if (mode === 'send' || mode === 'hold' || mode === 'drop') store.state.mode = mode;
    store.save();
    response.redirect(303, '/control');
  });
  router.post('/control/release', async (_request, response) => {
    await notices.release();
    response.redirect(303, '/control');
  });
  router.post('/control/release-reversed', async (_request, response) => {
    await notices.release(true);
    response.redirect(303, '/control');
  });
  router.post('/control/repeat/:id', async (request, response) => {
    await notices.repeat(request.params.id);
    response.redirect(303, '/control');
  });
  return router;
}
