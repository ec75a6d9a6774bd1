import { closeSync, fsyncSync, mkdirSync, openSync, readFileSync, renameSync, writeSync } from 'node:fs';
import path from 'node:path';

/** Reads a small JSON file; null when it is missing or was never finished. */
export function recall(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return null;
  }
}

/** Writes a small JSON file that only its owner reads: whole or not at all, whenever the power goes. */
export function remember(file, value) {
  mkdirSync(path.dirname(file), { recursive: true });
  const draft = `${file}.new`;
  const handle = openSync(draft, 'w', 0o600);
  try {
    writeSync(handle, `${JSON.stringify(value, null, 2)}\n`);
    fsyncSync(handle);
  } finally {
    closeSync(handle);
  }
  renameSync(draft, file);
  return value;
}
