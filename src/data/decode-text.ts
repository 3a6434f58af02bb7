import { isUtf8 } from 'node:buffer';
import type { DataPlan } from '../study/study.ts';

/** A first line longer than this is not looked for any further. */
const LONGEST_HEAD = 1 << 24;

export interface TextPiece {
  /** Ends with a line end, except where it is the last or one line is very long. */
  readonly text: string;
  readonly last: boolean;
  /** Whether bytes that are not UTF-8 were replaced by U+FFFD in this piece. */
  readonly replaced: boolean;
}

export interface DecodedText {
  /** What ends a row: "\n" stands for LF and CRLF alike. */
  readonly newline: '\n' | '\r';
  readonly encoding: 'utf-8' | 'latin-1';
  /** The file begins with the byte-order mark of UTF-16 and is not decoded. */
  readonly utf16: boolean;
  /** The first piece's text. */
  readonly head: string;
  /** How many bytes it was, a byte-order mark not counted. */
  readonly headBytes: number;
  /** Every piece in order, the head first. */
  readonly pieces: AsyncGenerator<TextPiece>;
}

/**
 * Bytes to text, cut after line ends: no character of UTF-8 holds the byte of a line end, so every piece can be
 * decoded by itself. A byte-order mark is dropped. The first piece is gathered from at least `headSize` bytes, however
 * small the chunks of the file.
 */
export async function decodeText(
  bytes: AsyncGenerator<Buffer>,
  declared: DataPlan['format']['encoding'],
  headSize: number,
): Promise<DecodedText> {
  const encoding = declared ?? 'utf-8';
  const decode = encoding === 'utf-8' ? decodeUtf8 : decodeLatin1;

  const start: Buffer[] = [];
  let held = Buffer.alloc(0);
  let newline: '\n' | '\r' | null = null;
  let ended = false;
  for (let wanted = Math.max(4, headSize); ; wanted *= 2) {
    let length = held.length;
    while (length < wanted && !ended) {
      const next = await bytes.next();
      if (next.done === true) {
        ended = true;
      } else {
        start.push(next.value);
        length += next.value.length;
      }
    }
    held = Buffer.concat([held, ...start.splice(0)]);
    newline = findNewline(held, ended);
    if (newline !== null || ended || held.length >= LONGEST_HEAD) break;
  }
  const utf16 = held.length >= 2 && (held.readUInt16BE(0) === 0xfffe || held.readUInt16BE(0) === 0xfeff);
  if (held.length >= 3 && held.readUIntBE(0, 3) === 0xefbbbf) held = held.subarray(3);
  const rowEnd = newline ?? '\n';
  const endByte = rowEnd.charCodeAt(0);

  const firstCut = ended ? held.length : held.lastIndexOf(endByte) + 1;
  const first: TextPiece = { ...decode(held.subarray(0, firstCut)), last: ended };

  async function* pieces(): AsyncGenerator<TextPiece> {
    yield first;
    if (ended) return;
    let tail: Buffer[] = [held.subarray(firstCut)];
    let tailLength = held.length - firstCut;
    for await (const chunk of bytes) {
      const end = chunk.lastIndexOf(endByte) + 1;
      if (end === 0) {
        tail.push(chunk);
        tailLength += chunk.length;
        // One line of this length ends the reading; hand it on so that the rows can say so.
        if (tailLength <= LONGEST_HEAD) continue;
        yield { ...decode(Buffer.concat(tail)), last: false };
        tail = [];
        tailLength = 0;
      } else {
        yield { ...decode(Buffer.concat([...tail, chunk.subarray(0, end)])), last: false };
        tail = [chunk.subarray(end)];
        tailLength = chunk.length - end;
      }
    }
    yield { ...decode(Buffer.concat(tail)), last: true };
  }

  return { newline: rowEnd, encoding, utf16, head: first.text, headBytes: firstCut, pieces: pieces() };
}

/** The first line end outside quotes; null where more bytes are needed. */
function findNewline(bytes: Buffer, ended: boolean): '\n' | '\r' | null {
  let quoted = false;
  for (let i = 0; i < bytes.length; i++) {
    const byte = bytes[i];
    if (byte === 0x22) quoted = !quoted;
    else if (quoted) continue;
    else if (byte === 0x0a) return '\n';
    else if (byte === 0x0d) {
      if (i + 1 === bytes.length && !ended) return null;
      return bytes[i + 1] === 0x0a ? '\n' : '\r';
    }
  }
  return null;
}

function decodeUtf8(bytes: Buffer): { text: string; replaced: boolean } {
  return { text: bytes.toString('utf8'), replaced: !isUtf8(bytes) };
}

/** What the bytes 0x80 to 0x9F stand for in text that says it is Latin-1 (WHATWG Encoding Standard, windows-1252). */
const HIGH_CONTROLS = '€\u0081‚ƒ„…†‡ˆ‰Š‹Œ\u008dŽ\u008f\u0090‘’“”•–—˜™š›œ\u009džŸ';

function decodeLatin1(bytes: Buffer): { text: string; replaced: boolean } {
  const text = bytes
    .toString('latin1')
    .replace(/[\u0080-\u009f]/g, (control) => HIGH_CONTROLS.charAt(control.charCodeAt(0) - 0x80));
  return { text, replaced: false };
}
