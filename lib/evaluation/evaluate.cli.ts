/** `npm run --silent evaluate -- FILE`: a document in, its result on stdout; or one problem a line on stderr and exit code 2. */
import { readFileSync, statSync } from 'node:fs';
import { evaluateDocument } from './evaluate-document';

const LARGEST_BYTES = 256 * 1024;

function fail(lines: string[]): never {
  process.stderr.write(`${lines.join('\n')}\n`);
  process.exit(2);
}

function readDocument(file: string): unknown {
  let text: string;
  try {
    if (statSync(file).size > LARGEST_BYTES)
      fail([`$: the file is ${statSync(file).size} bytes; at most ${LARGEST_BYTES} bytes are read`]);
    text = readFileSync(file, 'utf8');
  } catch {
    fail([`$: the file ${file} cannot be read; give the path of a JSON document`]);
  }
  try {
    return JSON.parse(text);
  } catch {
    fail(['$: this is not JSON; check for a missing bracket, quote or comma']);
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
