import type { NextConfig } from 'next';

const config: NextConfig = {
  poweredByHeader: false,
  typedRoutes: true,
  reactCompiler: true,
  serverExternalPackages: ['@node-rs/argon2', 'pg'],
  turbopack: { root: import.meta.dirname },
};

export default config;
