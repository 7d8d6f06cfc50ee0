import { layOut, type RenderedMail } from './layout.js';

export interface PasswordResetData {
  name: string;
  url: string;
  minutes: number;
}

export function passwordReset({ name, url, minutes }: PasswordResetData): RenderedMail {
  return layOut({
    subject: 'Set a new password',
    preview: `The link works once, for ${minutes} minutes.`,
    heading: 'Set a new password',
    blocks: [
      { kind: 'text', text: `Hello ${name}, somebody asked for a new password for your Linkfell account.` },
      { kind: 'button', label: 'Set a new password', url },
      {
        kind: 'text',
        text: `The link works once, for ${minutes} minutes. You will be signed out everywhere else.`,
      },
      { kind: 'note', text: 'If it was not you, do nothing: your password stays as it is.' },
    ],
  });
}
