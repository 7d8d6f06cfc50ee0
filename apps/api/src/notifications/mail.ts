import { templates, type TemplateData, type TemplateName } from './templates/templates.js';
import type { RenderedMail } from './templates/layout.js';

/** An invitation or its cancellation, RFC 5545 text as RFC 6047 carries it. */
export interface CalendarPart {
  method: 'REQUEST' | 'CANCEL';
  content: string;
}

export interface MailAttachment {
  filename: string;
  contentType: string;
  /** base64 */
  content: string;
}

/** One mail to one person, as it waits in the outbox. */
export type Mail = {
  [Name in TemplateName]: {
    template: Name;
    to: string;
    data: TemplateData<Name>;
    calendar?: CalendarPart;
    attachments?: MailAttachment[];
  };
}[TemplateName];

/** The template belongs to the data by the type of {@link Mail}, which TypeScript cannot follow through the lookup. */
export function render(mail: Mail): RenderedMail {
  const template = templates[mail.template] as (data: Mail['data']) => RenderedMail;
  return template(mail.data);
}
