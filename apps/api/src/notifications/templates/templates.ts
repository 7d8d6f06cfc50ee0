import { passwordChanged } from './password-changed.js';
import { passwordReset } from './password-reset.js';

/** Every mail we send, by name. A template is a pure function of data that survives JSON. */
export const templates = {
  'password-changed': passwordChanged,
  'password-reset': passwordReset,
} as const;

export type TemplateName = keyof typeof templates;
export type TemplateData<Name extends TemplateName> = Parameters<(typeof templates)[Name]>[0];
