const escapes: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };

export const escapeHtml = (text: string): string => text.replace(/[&<>"']/g, (sign) => escapes[sign] ?? sign);

export interface MailText {
  subject: string;
  text: string;
  html: string;
}

/** Plain paragraphs and one link, the same words in both forms; it reads without pictures and without HTML. */
export function mailLayout(mail: {
  subject: string;
  paragraphs: string[];
  link?: { label: string; url: string };
  foot: string;
}): MailText {
  const { subject, paragraphs, link, foot } = mail;
  const text = [...paragraphs, ...(link ? [`${link.label}:\n${link.url}`] : []), `-- \n${foot}`].join('\n\n');
  const paragraph = (words: string) => `<p style="margin:0 0 16px">${escapeHtml(words)}</p>`;
  const button = link
    ? `<p style="margin:24px 0"><a href="${escapeHtml(link.url)}" style="color:#14406e;font-weight:600">${escapeHtml(link.label)}</a></p>`
    : '';
  const html = `<!doctype html><html lang="en"><head><meta charset="utf-8"><title>${escapeHtml(subject)}</title></head><body style="margin:0;padding:24px;background:#f5f2e9;color:#1a2026;font:16px/1.5 sans-serif"><div style="max-width:560px">${paragraphs.map(paragraph).join('')}${button}<p style="margin:32px 0 0;color:#4b545c;font-size:14px">${escapeHtml(foot)}</p></div></body></html>`;
  return { subject, text, html };
}
