import { RESULT_FILES } from '../record/write-results.ts';
import { OVERVIEW_FILES } from './overview-files.ts';

/** Longest name of a folder, in bytes: file systems take 255, and a whole path is to stay usable. */
const MOST_BYTES = 100;

/** Names that Windows keeps for devices, with any ending (Microsoft, "Naming files, paths, and namespaces"). */
const DEVICE = /^(?:con|prn|aux|nul|com[0-9¹²³]|lpt[0-9¹²³])(?:\.|$)/i;

/** Names of files that may lie beside the folders. */
const OURS: ReadonlySet<string> = new Set(
  [...RESULT_FILES, ...OVERVIEW_FILES].map((name) => name.split('/')[0]!),
);

/**
 * A folder's name for each text, in their order: one that every usual file system takes, that leads nowhere else, and
 * that differs from all the others by more than letter case or how its characters are composed. A text that is such a
 * name already keeps it before others get a number.
 */
export function safeNames(texts: readonly string[]): string[] {
  const wanted = texts.map(safeName);
  const taken = new Set<string>();
  const names = new Array<string>(texts.length).fill('');
  const give = (index: number) => {
    let name = wanted[index]!;
    for (let more = 2; taken.has(folded(name)); more++) name = `${wanted[index]}-${more}`;
    taken.add(folded(name));
    names[index] = name;
  };
  const kept = texts.map((text, index) => text === wanted[index]);
  for (const first of [true, false]) {
    for (const index of texts.keys()) if (kept[index] === first) give(index);
  }
  return names;
}

function safeName(text: string): string {
  const plain = text
    // Half a pair of surrogates has no encoding in a file's name.
    .replace(/\p{Surrogate}/gu, '_')
    .normalize('NFC')
    // biome-ignore lint/suspicious/noControlCharactersInRegex: they are what is to be replaced
    .replace(/[\u0000-\u001f\u007f-\u009f<>:"/\\|?*]/g, '_')
    .trim();
  const cut = shortened(plain)
    .replace(/^\.+/, '_')
    .replace(/[. ]+$/, '_');
  const name = cut === '' ? '_' : cut;
  return DEVICE.test(name) || OURS.has(name.toLowerCase()) ? `_${name}` : name;
}

function shortened(text: string): string {
  let bytes = 0;
  let kept = '';
  for (const character of text) {
    bytes += Buffer.byteLength(character);
    if (bytes > MOST_BYTES) break;
    kept += character;
  }
  return kept;
}

function folded(name: string): string {
  return name.normalize('NFKC').toLowerCase();
}
