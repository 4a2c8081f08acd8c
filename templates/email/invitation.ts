import { type MailText, mailLayout } from './layout';

/** Somebody is asked to join an organisation. */
export function invitationMail(facts: {
  name: string;
  invitedBy: string;
  organisationName: string;
  roles: string[];
  url: string;
  validDays: number;
}): MailText {
  return mailLayout({
    subject: `${facts.organisationName} invites you to Witnessmark`,
    paragraphs: [
      `Dear ${facts.name},`,
      `${facts.invitedBy} invites you to join ${facts.organisationName} as ${facts.roles.join(' and ')}. Witnessmark keeps the measuring sheets and acceptance reports of turning machines.`,
      `The link below holds for ${facts.validDays} days and works once.`,
    ],
    link: { label: 'Accept the invitation', url: facts.url },
    foot: 'You have this mail because somebody typed your address. If it was not meant for you, do nothing; without the link nothing happens.',
  });
}
