/** Where a text stops being JSON. Line and column count from 1. */
export interface JsonFault {
  readonly line: number;
  readonly column: number;
  /** "Here a comma or "}" was expected." */
  readonly message: string;
}

/**
 * Finds the first fault of a text that `JSON.parse` refuses (whose own messages have a position in
 * some versions of the runtime only). Null where there is none. Does not recurse, so nesting cannot exhaust the stack.
 */
export function findJsonFault(text: string): JsonFault | null {
  const open: ('{' | '[')[] = [];
  let at = 0;
  let expected: Expected = 'value';

  for (;;) {
    at = skipSpace(text, at);
    const here = text[at];
    if (expected === 'end') {
      return here === undefined ? null : fault(text, at, 'nothing more was expected after the value');
    }
    if (here === undefined) return fault(text, at, `the text ends where ${WORDS[expected]} was expected`);

    if (expected === 'value' || expected === 'value or ]') {
      if (here === ']' && expected === 'value or ]') {
        open.pop();
        expected = after(open);
        at++;
      } else if (here === '{' || here === '[') {
        open.push(here);
        expected = here === '{' ? 'key or }' : 'value or ]';
        at++;
      } else {
        const end = here === '"' ? stringEnd(text, at) : wordEnd(text, at);
        if (end < 0) return fault(text, at, here === '"' ? BAD_STRING : `${WORDS[expected]} was expected`);
        expected = after(open);
        at = end;
      }
    } else if (expected === 'key' || expected === 'key or }') {
      if (here === '}' && expected === 'key or }') {
        open.pop();
        expected = after(open);
        at++;
      } else {
        if (here !== '"') return fault(text, at, `${WORDS[expected]} was expected`);
        const end = stringEnd(text, at);
        if (end < 0) return fault(text, at, BAD_STRING);
        at = skipSpace(text, end);
        if (text[at] !== ':') return fault(text, at, 'a colon was expected after the key');
        at++;
        expected = 'value';
      }
    } else {
      const close: '}' | ']' = expected === 'comma or }' ? '}' : ']';
      if (here === close) {
        open.pop();
        expected = after(open);
      } else if (here === ',') {
        expected = close === '}' ? 'key' : 'value';
      } else {
        return fault(text, at, `${WORDS[expected]} was expected`);
      }
      at++;
    }
  }
}

type Expected = 'value' | 'value or ]' | 'key' | 'key or }' | 'comma or }' | 'comma or ]' | 'end';

const WORDS: { readonly [expected in Expected]: string } = {
  value: 'a value',
  'value or ]': 'a value or "]"',
  key: 'a key in double quotes',
  'key or }': 'a key in double quotes or "}"',
  'comma or }': 'a comma or "}"',
  'comma or ]': 'a comma or "]"',
  end: 'the end',
};

const BAD_STRING = 'a text in double quotes is not closed or has a character that is not allowed in it';

function after(open: readonly ('{' | '[')[]): Expected {
  const innermost = open.at(-1);
  if (innermost === undefined) return 'end';
  return innermost === '{' ? 'comma or }' : 'comma or ]';
}

function skipSpace(text: string, from: number): number {
  let at = from;
  while (at < text.length && ' \t\n\r'.includes(text[at] as string)) at++;
  return at;
}

function stringEnd(text: string, from: number): number {
  // biome-ignore lint/suspicious/noControlCharactersInRegex: JSON texts may not hold them (RFC 8259, 7).
  const rule = /"(?:[^"\\\u0000-\u001f]|\\["\\/bfnrt]|\\u[0-9a-fA-F]{4})*"/y;
  rule.lastIndex = from;
  return rule.test(text) ? rule.lastIndex : -1;
}

function wordEnd(text: string, from: number): number {
  const rule = /(?:true|false|null|-?(?:0|[1-9]\d*)(?:\.\d+)?(?:[eE][+-]?\d+)?)(?![\w.+-])/y;
  rule.lastIndex = from;
  return rule.test(text) ? rule.lastIndex : -1;
}

function fault(text: string, at: number, message: string): JsonFault {
  const before = text.slice(0, at);
  const lineStart = before.lastIndexOf('\n') + 1;
  return { line: before.split('\n').length, column: at - lineStart + 1, message };
}
