import type { Letter } from './post';

interface Content {
	readonly to: string;
	readonly subject: string;
	readonly heading: string;
	readonly paragraphs: readonly string[];
	readonly link: { readonly words: string; readonly url: string };
	/** Cells of the foot, as on a title block: caption and value. */
	readonly foot: readonly (readonly [string, string])[];
}

// The look's light values, as mail programs understand them.
const DESK = '#dfe0e2';
const SHEET = '#fafbfc';
const INK = '#1a1d22';
const INK_2 = '#474b51';
const INK_3 = '#5d6167';
const RULE = '#a8abb0';
const FONT = "font-family:'Sofia Sans',system-ui,-apple-system,'Segoe UI',Arial,sans-serif";

const escaped = (text: string): string =>
	text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;').replaceAll('"', '&quot;');

const paragraph = (text: string): string =>
	`<p style="margin:0 0 14px;font-size:15px;line-height:23px;color:${INK}">${escaped(text)}</p>`;

const cell = ([caption, value]: readonly [string, string], at: number): string =>
	`<td valign="top" style="padding:7px 12px 9px;${at ? `border-left:1px solid ${RULE};` : ''}${FONT}">` +
	`<div style="font-size:11px;line-height:14px;color:${INK_3}">${escaped(caption)}</div>` +
	`<div style="font-size:13px;line-height:18px;font-weight:600;color:${INK}">${escaped(value)}</div></td>`;

function page({ subject, heading, paragraphs, link, foot }: Content): string {
	const url = escaped(link.url);
	return `<!doctype html>
<html lang="en-GB"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><title>${escaped(subject)}</title></head>
<body style="margin:0;background:${DESK}">
<table role="presentation" width="100%" cellspacing="0" cellpadding="0" style="background:${DESK}"><tr><td align="center" style="padding:24px 12px">
<table role="presentation" width="560" cellspacing="0" cellpadding="0" style="width:100%;max-width:560px;background:${SHEET};border:2px solid ${INK};border-collapse:collapse">
<tr><td style="padding:24px 28px 8px;${FONT};font-size:20px;line-height:28px;font-weight:700;color:${INK}">Evendraft</td></tr>
<tr><td style="padding:0 28px 18px;${FONT}">
<h1 style="margin:12px 0 14px;font-size:21px;line-height:28px;font-weight:600;color:${INK}">${escaped(heading)}</h1>
${paragraphs.map(paragraph).join('\n')}
<p style="margin:20px 0"><a href="${url}" target="_blank" style="display:inline-block;background:${INK};color:${SHEET};padding:9px 16px;font-size:15px;line-height:22px;font-weight:600;text-decoration:none">${escaped(link.words)}</a></p>
<p style="margin:0;font-size:12px;line-height:17px;color:${INK_2}">Or open this address:<br><a href="${url}" target="_blank" style="color:${INK_2};word-break:break-all">${url}</a></p>
</td></tr>
<tr><td style="padding:0;border-top:2px solid ${INK}"><table role="presentation" width="100%" cellspacing="0" cellpadding="0"><tr>${foot.map(cell).join('')}</tr></table></td></tr>
</table></td></tr></table>
</body></html>`;
}

function plain({ heading, paragraphs, link, foot }: Content): string {
	const cells = foot.map(([caption, value]) => `${caption}: ${value}`).join('\n');
	return [heading, ...paragraphs, `${link.words}:\n${link.url}`, `--\n${cells}`].join('\n\n') + '\n';
}

/** One letter in plain text and in HTML: a sheet with a heading, paragraphs, one link and a foot of cells. */
export function letter(content: Content): Letter {
	return { to: content.to, subject: content.subject, text: plain(content), html: page(content) };
}
