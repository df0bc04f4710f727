import type { LetterJob } from '../jobs/jobs.ts';

interface Recipient {
  name: string;
  email: string;
}

export const verifyLetter = ({ name, email }: Recipient, link: string): LetterJob => ({
  to: email,
  subject: 'Confirm your e-mail address',
  text: `${name},

Confirm that this is your address by opening this link. It works for one hour.

${link}

If you did not join Tubeplate, do nothing.`,
});

export const resetLetter = ({ name, email }: Recipient, link: string): LetterJob => ({
  to: email,
  subject: 'Set a new password',
  text: `${name},

Open this link to set a new password. It works for one hour and once. Every device signed in as you is then signed out.

${link}

If you did not ask for this, do nothing: your password stays as it is.`,
});
