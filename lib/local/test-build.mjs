import { mkdirSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { root } from './sources.mjs';

/**
 * The environment in which Next.js works in a folder of the tests' own, so that an app that runs from `.next` is not disturbed.
 *
 * Its TypeScript settings extend the project's: Next.js leaves settings that extend others as they are, and only this folder's
 * generated route types count, not those that another build left behind.
 */
export function testBuildEnvironment({ name, env }) {
  const folder = `.data/test/${name}`;
  const settings = {
    extends: '../../tsconfig.json',
    compilerOptions: { incremental: false, types: ['node', 'next', 'next/image-types/global'] },
    include: [
      ...['app', 'lib', 'physics', 'migrations', 'tests'].map((each) => `../../${each}/**/*`),
      '../../*.ts',
      `./${name}/types/**/*.ts`,
    ],
    exclude: ['../../node_modules', '../../next-env.d.ts'],
  };
  mkdirSync(path.join(root, '.data', 'test'), { recursive: true });
  writeFileSync(path.join(root, `${folder}.tsconfig.json`), JSON.stringify(settings, null, 2));
  return { ...env, CELLARSUN_BUILD_FOLDER: folder };
}

export const testSettings = (name) => `.data/test/${name}.tsconfig.json`;
