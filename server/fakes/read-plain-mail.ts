/** Reads a text message as our own mailer writes it: one part, UTF-8, plain, quoted-printable or base64. */
export function readPlainMail(raw: Buffer): { subject: string; text: string; messageId: string } {
  const message = raw.toString('utf8').replace(/\r\n/g, '\n');
  const end = message.indexOf('\n\n');
  const head = (end < 0 ? message : message.slice(0, end)).replace(/\n[ \t]+/g, ' ');
  const body = end < 0 ? '' : message.slice(end + 2);
  const header = (name: string) => new RegExp(`^${name}: *(.*)$`, 'im').exec(head)?.[1] ?? '';
  return {
    subject: decodeWords(header('Subject')),
    text: decodeBody(body, header('Content-Transfer-Encoding').toLowerCase()).trimEnd(),
    messageId: header('Message-ID').trim(),
  };
}

function decodeBody(body: string, encoding: string): string {
  if (encoding === 'base64') return Buffer.from(body, 'base64').toString('utf8');
  return encoding === 'quoted-printable' ? decodeQuoted(body.replace(/=\n/g, '')) : body;
}

/** Encoded words of RFC 2047 in a header. */
function decodeWords(text: string): string {
  const joined = text.replace(/\?=\s+=\?/g, '?==?');
  return joined.replace(/=\?utf-8\?([bq])\?([^?]*)\?=/gi, (_whole, kind: string, words: string) =>
    kind.toLowerCase() === 'b'
      ? Buffer.from(words, 'base64').toString('utf8')
      : decodeQuoted(words.replace(/_/g, ' ')),
  );
}

function decodeQuoted(text: string): string {
  const bytes = Buffer.from(text, 'utf8').toString('latin1');
  const decoded = bytes.replace(/=([0-9a-f]{2})/gi, (_whole, hex: string) =>
    String.fromCharCode(parseInt(hex, 16)),
  );
  return Buffer.from(decoded, 'latin1').toString('utf8');
}
