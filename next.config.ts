import type { NextConfig } from 'next';

// The tests build beside the app that may be running from .next; see lib/local/test.mjs.
const buildFolder = process.env['CELLARSUN_BUILD_FOLDER'];

const config: NextConfig = {
  poweredByHeader: false,
  typedRoutes: true,
  reactCompiler: true,
  serverExternalPackages: ['@node-rs/argon2', 'pg'],
  turbopack: { root: import.meta.dirname },
  ...(buildFolder && {
    distDir: buildFolder,
    // `npm test` checks the types beside the build; a second time would take half a minute more.
    typescript: { tsconfigPath: `${buildFolder}.tsconfig.json`, ignoreBuildErrors: true },
  }),
};

export default config;
