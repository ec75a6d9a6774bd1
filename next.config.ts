import type { NextConfig } from 'next';

// The tests build beside the app that may be running from .next; see lib/local/test.mjs.
const buildFolder = process.env['CELLARSUN_BUILD_FOLDER'];

const config: NextConfig = {
  poweredByHeader: false,
  typedRoutes: true,
  reactCompiler: true,
  serverExternalPackages: ['@node-rs/argon2', 'pg'],
  turbopack: { root: import.meta.dirname },
  ...(buildFolder && { distDir: buildFolder, typescript: { tsconfigPath: `${buildFolder}.tsconfig.json` } }),
};

export default config;
