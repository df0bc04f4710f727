const named: Readonly<Record<string, string>> = {
  processor: 'With the card processor',
  'platform-charge': 'Tubeplate’s charge',
};
const numbered: Readonly<Record<string, string>> = { held: 'Held on order', surveyor: 'Owed to surveyor' };

/** What a ledger account is, in words; the ids of orders and people shortened to what tells them apart. */
export function accountWords(account: string): string {
  const [kind = '', id = ''] = account.split(':');
  const words = numbered[kind];
  return words ? `${words} ${id.slice(0, 8)}` : (named[account] ?? account);
}
