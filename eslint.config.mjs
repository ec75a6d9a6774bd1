import { defineConfig, globalIgnores } from 'eslint/config';
import nextVitals from 'eslint-config-next/core-web-vitals';
import nextTs from 'eslint-config-next/typescript';

/** The house: app → lib → physics. Nothing points back. */
const group = (patterns, message) => ({ group: patterns, message });

const clock = [
  { object: 'Math', property: 'random', message: 'physics is deterministic.' },
  { object: 'Date', property: 'now', message: 'physics has no clock.' },
];

export default defineConfig([
  ...nextVitals,
  ...nextTs,
  globalIgnores(['.next/**', '.data/**', 'next-env.d.ts', 'node_modules/**', 'public/**']),
  {
    rules: {
      // Where somebody's access ends the page is loaded anew, so that nothing of theirs stays in memory.
      '@next/next/no-location-assign-relative-destination': 'off',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
    },
  },
  {
    files: ['physics/**/*.ts'],
    rules: {
      'no-restricted-imports': [
        'error',
        {
          patterns: [
            group(
              [
                '@/app/*',
                '@/lib/*',
                '**/lib/*',
                '**/app/*',
                'zod',
                'react',
                'react-*',
                'next',
                'next/*',
                'kysely',
                'pg',
                'node:*',
              ],
              'physics is pure and imports nothing above it.',
            ),
          ],
        },
      ],
      'no-restricted-globals': ['error', 'process', 'fetch', 'window', 'document', 'performance', 'setTimeout'],
      'no-restricted-properties': ['error', ...clock],
    },
  },
  {
    files: ['app/**/*.{ts,tsx}'],
    rules: {
      'no-restricted-imports': [
        'error',
        {
          patterns: [
            group(
              ['@/physics/*', '**/physics/*', 'kysely', 'pg', '@/lib/db/*', '**/*.queries'],
              'app imports lib services, schemas and hooks; never physics or the database.',
            ),
          ],
        },
      ],
    },
  },
  {
    files: ['lib/**/*.{ts,tsx,mjs}'],
    rules: {
      'no-restricted-imports': ['error', { patterns: [group(['@/app/*', '**/app/*'], 'lib never imports app.')] }],
    },
  },
  {
    files: ['migrations/**/*.ts'],
    rules: {
      'no-restricted-imports': [
        'error',
        { patterns: [group(['@/*', '../*'], 'a migration is frozen in time: it imports kysely only.')] },
      ],
    },
  },
]);
