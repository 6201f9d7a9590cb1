import { ROLE_NAMES, type Role } from '@/shared/roles/roles';

export interface MailText {
  readonly subject: string;
  readonly body: string;
}

export function resetMail(name: string, link: string, minutes: number): MailText {
  return {
    subject: 'A new password for Offsquare',
    body: [
      `Hello ${name},`,
      '',
      'somebody asked for a new password for your account. If it was you, open this link and type one:',
      '',
      link,
      '',
      `The link works once, for ${minutes} minutes. If it was not you, do nothing: your password stays as it is.`,
      '',
    ].join('\n'),
  };
}

export function invitationMail(shopName: string, invitedBy: string, role: Role, link: string, days: number): MailText {
  return {
    subject: `${shopName} asks you to join on Offsquare`,
    body: [
      'Hello,',
      '',
      `${invitedBy} asks you to join ${shopName} as ${ROLE_NAMES[role].toLowerCase()}. Open this link to begin:`,
      '',
      link,
      '',
      `The link works once, for ${days} days.`,
      '',
    ].join('\n'),
  };
}

export function sheetsMail(from: string, jobName: string, revision: number, link: string, note: string): MailText {
  return {
    subject: `Sheets of ${jobName}, revision ${revision}`,
    body: [
      'Hello,',
      '',
      `${from} sends you the sheets of ${jobName}, revision ${revision}:`,
      '',
      link,
      '',
      ...(note ? [note, ''] : []),
      'Bin what was printed of an earlier revision.',
      '',
    ].join('\n'),
  };
}
