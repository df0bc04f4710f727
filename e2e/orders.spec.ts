import { expect, expectAccessible, test } from './fixtures.ts';

const boiler = 'Silver-brazed pot boiler, new valve';

test('a price that changed is asked about again, an order left unpaid is paid later, and a cancelled one is refunded', async ({
  newPerson,
  faults,
}) => {
  test.setTimeout(180_000);
  const buyer = await newPerson('buyer', { isPhone: true });
  const surveyor = await newPerson('surveyor');
  const pay = buyer.getByRole('button', { name: /^Pay £/ });
  const commission = async () => {
    await buyer.goto('/boilers');
    await buyer.getByRole('link', { name: boiler }).click();
    await buyer.getByRole('link', { name: 'Commission a survey' }).click();
    await buyer.getByRole('radio', { name: /^External examination/ }).check();
    await buyer.getByRole('radio', { name: /Mabel Oduya/ }).check();
    await buyer.getByLabel('Please begin as soon as can be arranged').check();
  };

  await commission();
  const before = (await pay.textContent()) ?? '';
  await surveyor.goto('/desk/surveyor');
  const fee = surveyor.getByLabel('External examination');
  await fee.fill('2');
  await surveyor.getByRole('button', { name: 'Save' }).click();
  await expect(surveyor.getByText('At least £30.00')).toBeVisible();
  await expect(fee).toBeFocused();
  await expectAccessible(surveyor);
  await fee.fill('64');
  await surveyor.getByRole('button', { name: 'Save' }).click();
  await expect(surveyor.getByText('Saved', { exact: true })).toBeVisible();

  await pay.click();
  await expect(buyer.getByRole('alert')).toContainText('The price has changed since it was shown to you');
  await expect(pay).not.toHaveText(before);
  await expect(buyer.getByRole('row', { name: /External examination/ })).toContainText('£64.00');
  await expectAccessible(buyer);

  await pay.click();
  await buyer.getByRole('link', { name: 'Go back without paying' }).click();
  await expect(buyer.getByText('You came back without paying. Nothing has been charged.')).toBeVisible();

  await commission();
  await buyer.getByRole('radio', { name: /^Full survey/ }).check();
  await pay.click();
  await expect(buyer.getByRole('alert')).toContainText('You have begun to commission a survey');
  await buyer.getByRole('link', { name: 'My surveys' }).click();
  await expect(buyer.getByRole('heading', { name: 'Surveys', level: 1 })).toBeVisible();
  await buyer.getByRole('link', { name: boiler }).first().click();
  await pay.click();
  await buyer.getByLabel('Card number').fill('4242 4242 4242 4242');
  await buyer.getByLabel('Expiry').fill('12/39');
  await buyer.getByLabel('Security code').fill('123');
  await pay.click();
  await expect(buyer.getByText('Paid, and held. The surveyor has been asked.')).toBeVisible();

  await buyer.getByRole('button', { name: 'Cancel the survey' }).click();
  const dialog = buyer.getByRole('dialog');
  await expect(dialog).toContainText('goes back whole to the buyer’s card');
  await dialog.getByRole('button', { name: 'Cancel the survey' }).click();
  await expect(dialog.getByText('Give a reason in a few words')).toBeVisible();
  await dialog.getByLabel('Why').fill('I have bought another');
  await dialog.getByRole('button', { name: 'Cancel the survey' }).click();
  await expect(buyer.getByText('Refunded in full')).toBeVisible({ timeout: 60_000 });
  await expect(buyer.getByText('Tomos Pugh: I have bought another')).toBeVisible();
  await expectAccessible(buyer);

  // The refusals are the point of this test; the browser reports them on its console.
  faults.splice(0, faults.length, ...faults.filter((fault) => !/status of (409|422)/.test(fault)));
});
