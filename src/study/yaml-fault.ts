import type { ErrorCode, YAMLError } from 'yaml';

interface Sentence {
  readonly message: string;
  readonly hint?: string;
}

const COLON_HINT = 'A text that contains ": " or " #" stands in quotes.';

const QUOTES_HINT =
  'The text in quotes has ended before this; put the whole value in the other kind of quotes.';

/** What the parser's codes mean to somebody who writes a study. */
const SENTENCES: Partial<Record<ErrorCode, Sentence>> = {
  TAB_AS_INDENT: { message: 'A tab indents this line.', hint: 'YAML is indented with spaces only.' },
  BAD_INDENT: {
    message: 'The indentation of this line does not fit the lines above.',
    hint: 'Keys of one mapping begin in the same column, and brackets that are opened are closed.',
  },
  BLOCK_AS_IMPLICIT_KEY: {
    message: 'A key begins inside the value of another key.',
    hint: 'Begin it on a line of its own with the right indentation; a text that contains ": " stands in quotes.',
  },
  BLOCK_IN_FLOW: {
    message: 'A list or mapping by indentation stands inside brackets.',
    hint: 'Is a comma missing?',
  },
  MULTILINE_IMPLICIT_KEY: {
    message: 'A key goes over more than one line.',
    hint: 'Is a ":" missing, or a closing quotation mark?',
  },
  KEY_OVER_1024_CHARS: {
    message: 'A key is longer than 1024 characters.',
    hint: 'Is a closing quotation mark missing?',
  },
  MULTIPLE_DOCS: {
    message: 'A second document begins here.',
    hint: 'A study file holds one study; remove the line "---".',
  },
  MULTIPLE_ANCHORS: { message: 'A value has two anchors.' },
  MULTIPLE_TAGS: { message: 'A value has two tags.', hint: 'A text that begins with "!" stands in quotes.' },
  TAG_RESOLVE_FAILED: {
    message: 'A study file has no tags, and "!" begins one.',
    hint: 'A text that begins with "!" stands in quotes.',
  },
  BAD_COLLECTION_TYPE: { message: 'A study file has no tags, and "!" begins one.' },
  BAD_DIRECTIVE: {
    message: 'This directive is not known.',
    hint: 'A text that begins with "%" stands in quotes.',
  },
  BAD_ALIAS: {
    message: 'The name of an anchor or alias is missing or unusable.',
    hint: 'A text that begins with "&" or "*" stands in quotes.',
  },
  ALIAS_PROPS: { message: 'An alias cannot have an anchor or a tag.' },
  BAD_DQ_ESCAPE: {
    message: 'This escape is not known in a text in double quotes.',
    hint: 'Write \\\\ for a backslash, or use single quotes.',
  },
  BAD_SCALAR_START: { message: 'A text cannot begin with this character unless it is in quotes.' },
};

/** A fault of the YAML parser as code, sentence and hint. */
export function yamlFault(fault: YAMLError, text: string): { readonly code: 'yaml_syntax' } & Sentence {
  return { code: 'yaml_syntax', ...sentence(fault, text) };
}

function sentence(fault: YAMLError, text: string): Sentence {
  const unclosed = fault.code === 'BAD_INDENT' ? UNCLOSED.exec(fault.message) : null;
  if (unclosed === null) return SENTENCES[fault.code] ?? otherSentence(fault, text);
  return { message: `The closing ${unclosed[1]} is missing above, or this line is not indented enough.` };
}

const UNCLOSED = /end with a ([\]}])/;

function otherSentence(fault: YAMLError, text: string): Sentence {
  if (fault.code === 'MISSING_CHAR') {
    const closing = /closing (["'])|end with a (\S)/i.exec(fault.message);
    if (closing !== null) return { message: `The closing ${closing[1] ?? closing[2]} is missing.` };
    if (/comma|,/.test(fault.message)) return { message: 'A comma is missing between two items.' };
    return {
      message:
        'Something is missing here: a ":" after a key with a blank behind it, a comma or a closing mark.',
    };
  }
  const found = text.slice(fault.pos[0], fault.pos[1]).trim();
  const what = found === '' ? 'This' : `"${found.slice(0, 30)}"`;
  const afterQuotes = /["'][ \t]*$/.test(text.slice(Math.max(0, fault.pos[0] - 40), fault.pos[0]));
  return { message: `${what} is not expected here.`, hint: afterQuotes ? QUOTES_HINT : COLON_HINT };
}
