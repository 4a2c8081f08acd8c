/** The invented people of the demo scenario. Said openly on the sign-in page, and only in demo mode. */
export const demoPassword = 'witness-the-mark';

export const demoAccounts = [
  { email: 'admin@quillmere.example', who: 'administrator of Quillmere Machine Fitting' },
  { email: 'reviewer@quillmere.example', who: 'reviewer there: checks and issues reports' },
  { email: 'inspector@quillmere.example', who: 'inspector there: measures at the machine' },
  { email: 'customer@ashdown.example', who: 'customer, Ashdown Turned Parts: reads and signs' },
  { email: 'admin@brackwater.example', who: 'administrator of another organisation, sees nothing of the first' },
] as const;
