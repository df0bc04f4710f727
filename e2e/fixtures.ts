import { AxeBuilder } from '@axe-core/playwright';
import { test as base, expect } from '@playwright/test';
import type { Browser, BrowserContext, Page } from '@playwright/test';

export { expect } from '@playwright/test';

export type DemoPart = 'seller' | 'buyer' | 'surveyor' | 'office';
const parts: Record<DemoPart, string> = {
  seller: 'Sells boilers',
  buyer: 'Looks for a boiler',
  surveyor: 'Surveys boilers',
  office: 'Runs the office',
};

/** Faults that a page may not have: console errors, uncaught exceptions, failed requests. */
export function watchForFaults(page: Page, faults: string[]): void {
  page.on('console', (message) => {
    // The card page is another service's: a declined card is an answer of 402 there, and no fault of ours.
    const isOurs =
      message.location().url.startsWith(new URL(page.url()).origin) || message.location().url === '';
    if (message.type() === 'error' && isOurs && !page.url().includes('/pay/'))
      faults.push(`console: ${message.text()}`);
  });
  page.on('pageerror', (error) => faults.push(`uncaught: ${error.message}`));
  page.on('requestfailed', (request) => {
    const why = request.failure()?.errorText ?? '';
    // A page left while something was still coming is no fault.
    if (why !== 'net::ERR_ABORTED') faults.push(`request: ${request.method()} ${request.url()} ${why}`);
  });
}

/** No rule of WCAG 2.2 A and AA broken, as far as a machine can see. */
export async function expectAccessible(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page })
    .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'])
    .analyze();
  const found = violations.map(
    ({ id, nodes }) => `${id}: ${nodes.map((node) => node.target.join(' ')).join('; ')}`,
  );
  expect(found, `axe on ${page.url()}`).toEqual([]);
}

/** Signs in by the one-press demonstration account. */
export async function signInAs(page: Page, part: DemoPart): Promise<void> {
  await page.goto('/sign-in');
  await page.getByRole('button', { name: parts[part] }).click();
  if (part === 'office') await page.getByRole('button', { name: 'Go on without it for now' }).click();
  await expect(page.getByRole('heading', { name: 'My desk', level: 1 })).toBeVisible();
}

interface Fixtures {
  faults: string[];
  /** A browser of their own for one more person. */
  newPerson: (part: DemoPart, options?: { isPhone?: boolean }) => Promise<Page>;
}

const phone = { viewport: { width: 360, height: 760 }, hasTouch: true, isMobile: true };

async function openContext(browser: Browser, isPhone: boolean): Promise<BrowserContext> {
  return browser.newContext({ locale: 'en-GB', timezoneId: 'Europe/London', ...(isPhone ? phone : {}) });
}

export const test = base.extend<Fixtures>({
  faults: [
    async ({ page }, use) => {
      const faults: string[] = [];
      watchForFaults(page, faults);
      await use(faults);
      expect(faults).toEqual([]);
    },
    { auto: true },
  ],
  newPerson: async ({ browser, faults }, use) => {
    const contexts: BrowserContext[] = [];
    await use(async (part, { isPhone = false } = {}) => {
      const context = await openContext(browser, isPhone);
      contexts.push(context);
      const page = await context.newPage();
      watchForFaults(page, faults);
      await signInAs(page, part);
      return page;
    });
    for (const context of contexts) await context.close();
  },
});
