import path from 'node:path';
import type { Page } from '@playwright/test';
import { expect, expectAccessible, test } from './fixtures.ts';

const picture = (file: string) => path.resolve(import.meta.dirname, '../api/seed/photos', `${file}.jpg`);
const title = `Proving boiler, three-inch vertical ${String(Date.now() % 100_000)}`;

/** Goes to the next step of the sell form. */
const next = (page: Page) => page.getByRole('button', { name: /^Next:/ }).click();

async function addPhotograph(page: Page, view: string, file: string, count: number): Promise<void> {
  await page.getByRole('radio', { name: new RegExp(`^${view}`) }).check();
  await page.locator('input[type=file]').first().setInputFiles(picture(file));
  await expect(page.getByRole('heading', { name: `${String(count)} so far` })).toBeVisible({
    timeout: 60_000,
  });
}

async function listBoiler(page: Page): Promise<void> {
  await page.goto('/sell');
  await page.getByRole('button', { name: 'List a boiler' }).click();
  await page.getByLabel('Title').fill(title);
  await page.getByRole('radio', { name: /^Vertical multi-tube/ }).check();
  await page.getByLabel('Material').selectOption('Copper');
  await page.getByLabel('How it is joined').selectOption('Silver brazed');
  await page
    .getByLabel('Describe it')
    .fill('Made for this journey: twelve tubes, a gas burner, and a history short enough to tell.');
  await expectAccessible(page);
  await next(page);
  await page.getByLabel('Claimed working pressure').fill('60');
  await page.getByLabel('The figure rests on').selectOption('On a test certificate');
  await page.getByLabel('Water capacity, full').fill('1.2');
  await page.getByLabel('Barrel, outside diameter').fill('3 1/2');
  await page.getByLabel('Barrel, length').fill('7');
  await expectAccessible(page);
  await next(page);
  for (const fitting of [
    'Safety valve',
    'Pressure gauge',
    'Water gauge',
    'Check valve',
    'Hand feed pump',
    'Stop valve or regulator',
  ]) {
    await page.getByLabel(fitting, { exact: true }).check();
  }
  await page.getByRole('radio', { name: 'Gas' }).check();
  await next(page);
  await page.getByRole('button', { name: 'Add to the history' }).click();
  await page.getByLabel('When').fill('2009');
  await page.getByLabel('What happened').fill('Built over one winter.');
  await next(page);
  await addPhotograph(page, 'Whole boiler', 'a1-vertical-multitube-threequarter', 1);
  await addPhotograph(page, 'Top tubeplate', 'a3-vertical-multitube-top-tubeplate', 2);
  await addPhotograph(page, 'Fittings', 'a2-vertical-multitube-fittings', 3);
  for (const [index, words] of ['The whole boiler', 'The top tubeplate', 'Its fittings'].entries()) {
    const box = page.getByLabel('What it shows').nth(index);
    await box.fill(words);
    const saved = page.waitForResponse(
      (answer) => answer.url().includes('/api/photos/') && answer.request().method() === 'PATCH',
    );
    await box.blur();
    expect((await saved).ok()).toBe(true);
  }
  await expectAccessible(page);
  await next(page);
  await page.getByLabel('Defects you know of').fill('None known');
  await page.getByLabel('Repairs you know of').fill('None known');
  await page.getByLabel('Lagging').selectOption('No lagging');
  await page.getByLabel('It is mine to sell').check();
  await page.getByLabel('What I have written is true').check();
  await next(page);
  await page.getByLabel('Nearest town').fill('Hebden');
  await page.getByRole('option', { name: /Hebden Bridge/ }).click();
  await page.getByLabel('Address', { exact: true }).fill('9 Proving Yard');
  await page.getByLabel('Postcode').fill('HX7 8ZZ');
  await page.getByLabel('Asking price').fill('345');
  await next(page);
  await expect(page.getByText('Nothing is missing.')).toBeVisible();
  await page.getByRole('button', { name: 'List it' }).click();
  await expect(page.getByRole('heading', { name: title, level: 1 })).toBeVisible();
}

async function commission(page: Page): Promise<string> {
  await page.goto('/boilers');
  await page.getByRole('link', { name: title }).click();
  await expect(page.getByText('9 Proving Yard')).toHaveCount(0);
  await expectAccessible(page);
  await page.getByRole('link', { name: 'Commission a survey' }).click();
  await page.getByRole('radio', { name: /^Full survey with steam test/ }).check();
  await page.getByRole('radio', { name: /Mabel Oduya/ }).check();
  await page.getByRole('button', { name: /^Pay £/ }).click();
  await expect(page.getByText('Ask for the work to begin, or wait fourteen days')).toBeVisible();
  await page.getByLabel('Please begin as soon as can be arranged').check();
  await expectAccessible(page);
  await page.getByRole('button', { name: /^Pay £/ }).click();

  await page.getByLabel('Card number').fill('4000 0000 0000 0002');
  await page.getByLabel('Expiry').fill('12/39');
  await page.getByLabel('Security code').fill('123');
  await page.getByRole('button', { name: /^Pay £/ }).click();
  await expect(page.getByRole('alert')).toHaveText('Your card has been declined.');
  await page.getByLabel('Card number').fill('4242 4242 4242 4242');
  await page.getByLabel('Security code').fill('123');
  await page.getByRole('button', { name: /^Pay £/ }).click();
  await expect(page.getByText('Paid and held; waiting for the surveyor to accept').first()).toBeVisible();
  await expectAccessible(page);
  return new URL(page.url()).pathname;
}

const inDays = (days: number): string => {
  const at = new Date(Date.now() + days * 86_400_000);
  return `${at.toISOString().slice(0, 10)}T10:00`;
};

async function arrange(surveyor: Page, seller: Page, order: string): Promise<void> {
  await surveyor.goto('/desk');
  await surveyor.goto(order);
  await expect(surveyor.getByText('9 Proving Yard')).toHaveCount(0);
  await surveyor.getByRole('button', { name: 'Accept the job' }).click();
  await surveyor.getByLabel('Time 1').fill(inDays(2));
  await surveyor.getByLabel('Time 2').fill(inDays(3));
  await surveyor.getByRole('button', { name: 'Propose these times' }).click();
  await expect(surveyor.getByRole('heading', { name: 'Propose times anew' })).toBeVisible();

  await seller.goto(order);
  await seller.getByRole('radio').first().check();
  await expectAccessible(seller);
  await seller.getByRole('button', { name: 'Agree this time' }).click();
  await expect(seller.getByText('Time agreed', { exact: true }).first()).toBeVisible();
}

/** To the next screen of the examination. */
async function onward(page: Page): Promise<void> {
  const heading = page.getByRole('heading', { level: 1 });
  const before = (await heading.textContent()) ?? '';
  await page.getByRole('navigation', { name: 'Examination' }).getByRole('link').last().click();
  await expect(heading).not.toHaveText(before);
}

async function examine(page: Page): Promise<void> {
  await page.getByRole('link', { name: 'Day and instruments' }).first().click();
  await page.getByRole('button', { name: 'It is today' }).click();
  for (const kind of ['Test pressure gauge', 'Carbon monoxide meter']) {
    await page.getByLabel('Add an instrument').selectOption({ label: kind });
  }
  const lastMonth = new Date(Date.now() - 30 * 86_400_000).toISOString().slice(0, 10);
  for (const box of await page.getByLabel('Calibrated on').all()) await box.fill(lastMonth);
  await page.getByLabel('Full scale').fill('300');
  await expectAccessible(page);
  await onward(page);
  for (;;) {
    const item = (await page.getByRole('heading', { level: 1 }).textContent()) ?? '';
    if (item === 'Hydraulic test') break;
    await page
      .getByRole('radio', { name: item.startsWith('Paint') ? 'Needs attention' : 'Sound', exact: true })
      .check();
    for (const way of await page.getByRole('group', { name: 'Examined' }).getByRole('checkbox').all())
      await way.check();
    if (item.startsWith('Paint')) {
      await page.getByText('Chipped').first().click();
      await page.locator('input[type=file]').first().setInputFiles(picture('k07-cracked-paint-chimney'));
      await expect(page.getByRole('button', { name: /Describe or take off/ })).toBeVisible({
        timeout: 60_000,
      });
      await expectAccessible(page);
    }
    await onward(page);
  }
  await page.getByRole('button', { name: 'Record a hydraulic test' }).click();
  for (const caution of ['Filled to the top', 'own gauge is off', 'gagged'])
    await page.getByLabel(caution).check();
  for (const [minute, pressure] of [
    [0, 0],
    [4, 91],
    [15, 90.5],
  ]) {
    await page.getByLabel('Pressure', { exact: true }).fill(String(pressure));
    await page.getByLabel('Minute', { exact: true }).fill(String(minute));
    await page.getByRole('button', { name: 'Add the reading' }).click();
  }
  await page.getByLabel('Began at minute').selectOption('4');
  await page.getByLabel('Ended at minute').selectOption('15');
  await expectAccessible(page);
  await onward(page);
  await page.getByRole('button', { name: 'Record a steam test' }).click();
  await page.getByLabel('Steam was raised').check();
  await page.getByLabel('Lifts at').fill('60');
  await page.getByLabel('Highest pressure').fill('63');
  await page.getByLabel('Reseats at').fill('56');
  await page.getByLabel('Water gauge blown through').check();
  for (const question of ['Both passages clear', 'Feeds delivered', 'Flame settled', 'Gas tight']) {
    await page.getByRole('group', { name: question }).getByRole('radio', { name: 'Yes' }).check();
  }
  await page.getByLabel('Carbon monoxide at the operator').fill('7');
  await expectAccessible(page);
  await onward(page);
  await page.getByLabel('To the buyer').fill('A tidy small boiler; the chimney wants paint.');
  await onward(page);
  await expect(page.getByRole('heading', { name: 'What it comes to' })).toBeVisible();
  await page.getByLabel('I am independent').check();
  await page.getByLabel('I examined this boiler myself').check();
  await page.getByLabel('Your full name').fill('Mabel Oduya');
  await expectAccessible(page);
  await page.getByRole('button', { name: 'File the report' }).click();
  await page.waitForURL(/\/reports\//);
}

test('a boiler is listed, surveyed, reported on, and the fee released', async ({ newPerson }) => {
  test.setTimeout(300_000);
  const seller = await newPerson('seller');
  await listBoiler(seller);

  const buyer = await newPerson('buyer');
  const order = await commission(buyer);

  const surveyor = await newPerson('surveyor', { isPhone: true });
  await arrange(surveyor, seller, order);

  await buyer.goto('/letters');
  const agreed = buyer
    .locator('details')
    .filter({ hasText: title })
    .or(buyer.locator('details').filter({ hasText: 'calendar' }))
    .first();
  await expect(agreed).toBeVisible();
  await expectAccessible(buyer);

  await surveyor.goto(order);
  await expect(surveyor.getByText('9 Proving Yard')).toBeVisible();
  await surveyor.getByRole('button', { name: 'Begin the examination' }).click();
  await surveyor.getByRole('link', { name: 'Go on with the examination' }).click();
  await examine(surveyor);
  await expect(surveyor.getByText('In steaming order').first()).toBeVisible();

  await buyer.goto(order);
  await buyer.getByRole('link', { name: 'Read the report' }).click();
  await expect(buyer.getByText('In steaming order').first()).toBeVisible();
  await expectAccessible(buyer);
  await buyer.goto(order);
  await buyer.getByRole('button', { name: 'Accept the report and release the fee' }).click();
  await expect(buyer.getByText('Settled; the surveyor has been paid').first()).toBeVisible({
    timeout: 45_000,
  });

  const office = await newPerson('office');
  await office.goto('/office/money');
  await expect(office.getByText('Ledger and payment service agree to the penny.')).toBeVisible();
  await expect(office.getByText('Fee sent to the surveyor').first()).toBeVisible();
  await expectAccessible(office);

  await buyer.goto('/boilers?verdict=in-steaming-order');
  await expect(buyer.getByRole('link', { name: title })).toBeVisible();
});
