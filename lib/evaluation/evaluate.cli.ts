/** `npm run --silent evaluate -- FILE`: a document in, its result on stdout; or one problem a line on stderr and exit code 2. */
import { readFileSync, statSync } from 'node:fs';
import { evaluateDocument } from './evaluate-document';

const LARGEST_BYTES = 256 * 1024;

function fail(lines: string[]): never {
  process.stderr.write(`${lines.join('\n')}\n`);
  process.exit(2);
}

const tooLarge = (bytes: number): never =>
  fail([`$: the file is ${bytes} bytes; at most ${LARGEST_BYTES} bytes are read`]);

function readText(file: string): string {
  let bytes: Buffer;
  try {
    if (statSync(file).size > LARGEST_BYTES) return tooLarge(statSync(file).size);
    bytes = readFileSync(file);
  } catch {
    return fail([`$: the file ${file} cannot be read; give the path of a JSON document`]);
  }
  // A pipe has no size before it is read.
  return bytes.byteLength > LARGEST_BYTES ? tooLarge(bytes.byteLength) : bytes.toString('utf8');
}

function readDocument(file: string): unknown {
  const text = readText(file);
  try {
    return JSON.parse(text);
  } catch {
    return fail(['$: this is not JSON; check for a missing bracket, quote or comma']);
  }
}

const [file, ...more] = process.argv.slice(2);
if (!file || more.length > 0) fail(['$: give one file, as in: npm run --silent evaluate -- scenario.json']);

const evaluated = evaluateDocument(readDocument(file));
if (evaluated.ok) process.stdout.write(`${JSON.stringify(evaluated.result)}\n`);
else {
  const line = ({ path, value, range, unit, message }: (typeof evaluated.problems)[number]) =>
    `$${path ? `.${path}` : ''}: ${JSON.stringify(value)}; allowed: ${range}${unit ? ` ${unit}` : ''}; ${message}`;
  fail(evaluated.problems.map(line));
}
