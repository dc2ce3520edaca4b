import type { Letterhead, MailContent } from './mail-content.js';

const lineWidth = 76;

/** The plain-text part: reads by itself, lines no longer than mail programs show. */
export function renderText(content: MailContent, letterhead: Letterhead): string {
  const facts = (content.facts ?? []).map(([label, value]) => `${label}: ${value}`).join('\n');
  const action = content.action ? `${content.action.label}:\n${content.action.url}` : '';
  const caution = content.caution ? wrap(`Caution: ${content.caution}`) : '';
  return [
    content.heading,
    ...content.paragraphs.map(wrap),
    facts,
    action,
    ...(content.closing ?? []).map(wrap),
    caution,
    ['-- ', letterhead.name, ...letterhead.lines].join('\n'),
  ]
    .filter((part) => part !== '')
    .join('\n\n');
}

function wrap(paragraph: string): string {
  const lines: string[] = [];
  let line = '';
  for (const word of paragraph.split(' ')) {
    if (line !== '' && line.length + word.length >= lineWidth) {
      lines.push(line);
      line = word;
    } else {
      line = line === '' ? word : `${line} ${word}`;
    }
  }
  return [...lines, line].join('\n');
}

/** Colours of the product's light look; mail programs take no style sheets, so each element carries its own. */
const ink = '#18211e';
const inkSoft = '#55625c';
const line = '#d5dbd6';
const board = '#0e5b47';
const tape = '#8a5a00';
const tapeGround = '#ffe9b8';
const font = "font-family:Roboto,'Helvetica Neue',Arial,sans-serif";

/** The HTML part: one column, no images, nothing fetched from anywhere. */
export function renderHtml(content: MailContent, letterhead: Letterhead): string {
  return `<!doctype html>
<html lang="en">
<head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><title>${escape(content.heading)}</title></head>
<body style="margin:0;background:#f4f6f3;color:${ink};${font};font-size:15px;line-height:1.5">
<table role="presentation" width="100%" cellpadding="0" cellspacing="0"><tr><td align="center" style="padding:24px 12px">
<table role="presentation" width="560" cellpadding="0" cellspacing="0" style="max-width:560px;width:100%;background:#ffffff;border:1px solid ${line};border-radius:3px">
<tr><td style="padding:16px 24px;border-bottom:1px solid ${line};font-weight:600">${escape(letterhead.name)}</td></tr>
<tr><td style="padding:24px">
<h1 style="margin:0 0 16px;font-size:24px;line-height:1.2;font-weight:600">${escape(content.heading)}</h1>
${content.paragraphs.map(paragraph).join('\n')}
${factsTable(content.facts ?? [])}
${content.action ? actionLink(content.action) : ''}
${(content.closing ?? []).map(paragraph).join('\n')}
${content.caution ? cautionBox(content.caution) : ''}
</td></tr>
<tr><td style="padding:16px 24px;border-top:1px solid ${line};color:${inkSoft};font-size:13px">${letterhead.lines.map(escape).join('<br>')}</td></tr>
</table>
</td></tr></table>
</body>
</html>
`;
}

function paragraph(text: string): string {
  return `<p style="margin:0 0 16px">${escape(text)}</p>`;
}

function factsTable(facts: NonNullable<MailContent['facts']>): string {
  if (facts.length === 0) return '';
  const rows = facts.map(
    ([label, value]) =>
      `<tr><td style="padding:6px 16px 6px 0;border-bottom:1px solid ${line};color:${inkSoft}">${escape(label)}</td>` +
      `<td align="right" style="padding:6px 0;border-bottom:1px solid ${line};font-variant-numeric:tabular-nums">${escape(value)}</td></tr>`,
  );
  return `<table width="100%" cellpadding="0" cellspacing="0" style="margin:0 0 16px;font-size:15px">${rows.join('')}</table>`;
}

function actionLink(action: NonNullable<MailContent['action']>): string {
  const style = `display:inline-block;padding:12px 20px;background:${board};color:#ffffff;border-radius:3px;text-decoration:none;font-weight:500`;
  return (
    `<p style="margin:0 0 8px"><a href="${escape(action.url)}" style="${style}">${escape(action.label)}</a></p>` +
    `<p style="margin:0 0 16px;color:${inkSoft};font-size:13px;word-break:break-all">${escape(action.url)}</p>`
  );
}

function cautionBox(text: string): string {
  return `<p style="margin:0;padding:10px 14px;border-left:10px solid ${tape};background:${tapeGround}">Caution: ${escape(text)}</p>`;
}

const entities: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

function escape(text: string): string {
  return text.replaceAll(/[&<>"']/g, (character) => entities[character] ?? character);
}
