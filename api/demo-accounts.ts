/** The accounts of a demonstration, shown on its sign-in page. */
export const demoPassword = 'steam-raising-day';

export const demoAccounts = [
  { email: 'seller@tubeplate.example', name: 'Harriet Lowe', part: 'Sells boilers', password: demoPassword },
  {
    email: 'buyer@tubeplate.example',
    name: 'Tomos Pugh',
    part: 'Looks for a boiler',
    password: demoPassword,
  },
  {
    email: 'surveyor@tubeplate.example',
    name: 'Mabel Oduya',
    part: 'Surveys boilers',
    password: demoPassword,
  },
  { email: 'office@tubeplate.example', name: 'Idris Fenn', part: 'Runs the office', password: demoPassword },
] as const;
