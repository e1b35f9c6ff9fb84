/** The HTML of an e-mail, made from its text: the same words, one look, nothing that could be script. */

/** Paper, sheet, ink and pine of the look; mail programs that darken do it by themselves. */
const page =
  'margin:0;padding:24px;background:#f6f4ee;color:#1b1f23;' +
  "font:16px/1.5 'Work Sans',-apple-system,'Segoe UI',Helvetica,Arial,sans-serif";
const card =
  'max-width:560px;margin:0 auto;padding:24px;background:#ffffff;border:1px solid #d9d4c7;border-radius:3px';
const button =
  'display:inline-block;padding:12px 20px;background:#1e4b43;color:#ffffff;border-radius:3px;text-decoration:none';

/**
 * Paragraphs at blank lines, line breaks kept, every character escaped; a line that is an address alone
 * becomes a button with the given words, with the address below it for those who want to see it.
 * Example: "Hello <Rosa>,\n\nBye" has "<p …>Hello &lt;Rosa&gt;,</p>" and "<p …>Bye</p>".
 */
export function emailHtml(options: {
  text: string;
  language: string;
  buttonWords: string;
}): string {
  const { text, language, buttonWords } = options;
  const paragraphs = text
    .split(/\n{2,}/)
    .map((paragraph) => {
      const lines = paragraph.split('\n').map((line) => lineHtml(line, buttonWords));
      return `<p style="margin:0 0 16px">${lines.join('<br>')}</p>`;
    })
    .join('\n');
  return `<!doctype html>
<html lang="${escapeHtml(language)}">
<head><meta charset="utf-8"><meta name="viewport" content="width=device-width"></head>
<body style="${page}"><div style="${card}">
${paragraphs}
</div></body>
</html>`;
}

export function escapeHtml(text: string): string {
  return text
    .replaceAll('&', '&amp;')
    .replaceAll('<', '&lt;')
    .replaceAll('>', '&gt;')
    .replaceAll('"', '&quot;')
    .replaceAll("'", '&#39;');
}

function lineHtml(line: string, buttonWords: string): string {
  const shown = escapeHtml(line);
  if (!/^https?:\/\/\S+$/.test(line.trim())) return shown;
  const words = escapeHtml(buttonWords);
  return `<a href="${shown.trim()}" style="${button}">${words}</a><br><span style="font-size:13px;color:#565c61">${shown}</span>`;
}
