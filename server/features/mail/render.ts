/** One template, two forms: the plain text and the HTML of a mail, in the person's language. */
import { render } from '../../../shared/wording/render';
import type { MailMessage } from './message';

export interface RenderedMail {
  subject: string;
  text: string;
  html: string;
}

const escapeHtml = (value: string): string => value.replace(/[&<>"']/g, (sign) => `&#${sign.charCodeAt(0)};`);

export function renderMail(message: MailMessage, baseUrl: string): RenderedMail {
  const say = (part: string) =>
    render(message.language, { key: `mail.${message.kind}.${part}`, params: message.params });
  const lines = say('body').split('\n');
  const link = message.path === undefined ? null : baseUrl + message.path;
  const action = link === null ? null : say('action');
  const foot = render(message.language, { key: 'mail.foot' });
  const linkLine = link === null || action === null ? [] : [`${action}: ${link}`];
  const text = [...lines, ...linkLine, '', foot].join('\n');
  const htmlLink =
    link === null || action === null ? '' : `<p><a href="${escapeHtml(link)}">${escapeHtml(action)}</a></p>`;
  const html = `<!doctype html><html lang="${message.language}"><body>${lines.map((line) => `<p>${escapeHtml(line)}</p>`).join('')}${htmlLink}<p>${escapeHtml(foot)}</p></body></html>`;
  return { subject: say('subject'), text, html };
}
