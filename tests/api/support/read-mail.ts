// A small reader of mails for the tests, written from RFC 5322 (headers, folding), RFC 2045 (quoted-printable,
// base64), RFC 2046 (multipart) and RFC 2047 (encoded words): independent of the library that writes them.

export interface ReadMail {
  headers: ReadonlyMap<string, readonly string[]>;
  header(name: string): string;
  text: string;
  html: string;
}

interface Part {
  headers: Map<string, string[]>;
  body: string;
}

function splitPart(raw: string): Part {
  const end = raw.indexOf('\r\n\r\n');
  if (end < 0) throw new Error('a mail without an empty line after its headers');
  const headers = new Map<string, string[]>();
  for (const line of raw
    .slice(0, end)
    .replace(/\r\n(?=[ \t])/g, '')
    .split('\r\n')) {
    const [, name, value] = /^([!-9;-~]+):[ \t]*(.*)$/.exec(line) ?? [];
    if (name === undefined || value === undefined) throw new Error(`not a header: ${line}`);
    const key = name.toLowerCase();
    headers.set(key, [...(headers.get(key) ?? []), value]);
  }
  return { headers, body: raw.slice(end + 4) };
}

const bytesOfQuoted = (text: string): Buffer =>
  Buffer.from(
    text.replace(/=([0-9A-F]{2})/gi, (_, hex: string) => String.fromCharCode(Number.parseInt(hex, 16))),
    'latin1',
  );

const decodeWords = (value: string): string =>
  value
    .replace(/(=\?[^?]+\?[bq]\?[^?]*\?=)\s+(?==\?)/gi, '$1')
    .replace(/=\?utf-8\?([bq])\?([^?]*)\?=/gi, (_, how: string, said: string) =>
      how.toLowerCase() === 'b'
        ? Buffer.from(said, 'base64').toString()
        : bytesOfQuoted(said.replaceAll('_', ' ')).toString(),
    );

function decodeBody({ headers, body }: Part): string {
  switch (headers.get('content-transfer-encoding')?.[0]?.toLowerCase()) {
    case 'base64':
      return Buffer.from(body, 'base64').toString();
    case 'quoted-printable':
      return bytesOfQuoted(body.replace(/=[ \t]*\r\n/g, '')).toString();
    default:
      return body;
  }
}

/** Reads a mail with a plain and an HTML alternative; throws where it is not well formed. */
export function readMail(bytes: Buffer | string): ReadMail {
  const raw = bytes.toString('latin1' as BufferEncoding);
  const bare = raw.replaceAll('\r\n', '');
  if (/[\r\n]/.test(bare)) throw new Error('a line that does not end with CR LF');
  const whole = splitPart(raw);
  const type = whole.headers.get('content-type')?.[0] ?? '';
  const boundary = /^multipart\/alternative;\s*boundary="([^"]+)"/i.exec(type)?.[1];
  if (boundary === undefined) throw new Error(`not two alternatives: ${type}`);
  const pieces = `\r\n${whole.body}`.split(`\r\n--${boundary}`);
  const parts = pieces.slice(1, -1).map((piece) => splitPart(piece.replace(/^\r\n/, '')));
  const of = (wanted: string) => {
    const part = parts.find(({ headers }) => headers.get('content-type')?.[0]?.startsWith(wanted));
    if (part === undefined) throw new Error(`no part of type ${wanted}`);
    return decodeBody(part).replaceAll('\r\n', '\n');
  };
  const header = (name: string) => {
    const values = whole.headers.get(name.toLowerCase()) ?? [];
    if (values.length !== 1) throw new Error(`${values.length} headers ${name}`);
    return decodeWords(values[0] ?? '');
  };
  return { headers: whole.headers, header, text: of('text/plain'), html: of('text/html') };
}
