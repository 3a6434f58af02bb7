import type { StudyRecord } from '../record-type.ts';
import type { AgainView } from '../view.ts';

/** A file name as a shell takes it: quoted where it is more than plain letters. */
function shellWord(text: string): string {
  const plain = text.replace(/[\r\n]+/g, ' ');
  return /^[\w./@+=-]+$/.test(plain) ? plain : `'${plain.replace(/'/g, "'\\''")}'`;
}

export function againView(record: StudyRecord): AgainView {
  const { study, data, tool } = record;
  return {
    commands: [
      ['npx plumbrule fit', shellWord(study.file), ...givenOptions(study)].join(' '),
      'npx plumbrule render record.json',
      `sha256sum ${shellWord(study.file)} ${shellWord(data.file)}`,
    ],
    parameters: (study.parameters ?? []).map((parameter) => ({
      name: parameter.name,
      value: String(parameter.value),
      default: String(parameter.default),
      source: parameter.given ? 'given' : 'default',
    })),
    files: [
      { role: 'Study', name: study.file, sha256: study.sha256 },
      { role: 'Data', name: data.file, sha256: data.sha256 },
    ],
    tool: `${tool.name} ${tool.version}`,
    format: record.format,
    reading: `Read as ${data.encoding === 'utf-8' ? 'UTF-8' : 'Latin-1'} with ${delimiterName(data.delimiter)} between cells.`,
    settings: study.settings.map((s) => ({
      key: s.key,
      value: s.value,
      written: s.written ? 'written' : 'default',
    })),
  };
}

/** `--with` for each parameter that the run was given. */
function givenOptions({ parameters = [] }: StudyRecord['study']): string[] {
  return parameters
    .filter(({ given }) => given)
    .map(({ name, value }) => `--with ${shellWord(`${name}=${value}`)}`);
}

function delimiterName(delimiter: string): string {
  switch (delimiter) {
    case ',':
      return 'a comma';
    case ';':
      return 'a semicolon';
    case '\t':
      return 'a tab';
    case ' ':
      return 'a space';
    default:
      return `“${delimiter}”`;
  }
}
