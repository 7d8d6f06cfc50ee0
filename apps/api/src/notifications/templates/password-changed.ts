import { layOut, type RenderedMail } from './layout.js';

export interface PasswordChangedData {
  name: string;
  url: string;
}

export function passwordChanged({ name, url }: PasswordChangedData): RenderedMail {
  return layOut({
    subject: 'Your password was changed',
    preview: 'You have been signed out everywhere.',
    heading: 'Your password was changed',
    blocks: [
      {
        kind: 'text',
        text: `Hello ${name}, the password of your Linkfell account was changed a moment ago, and every browser was signed out.`,
      },
      { kind: 'text', text: 'If it was you, there is nothing to do. If it was not, set a new password now:' },
      { kind: 'button', label: 'Ask for a new link', url },
    ],
  });
}
