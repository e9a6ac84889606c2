import path from 'node:path';
import { fileURLToPath } from 'node:url';

// A second place to build in, so that a build never goes where a running server reads: scripts/setup/build.mjs.
const distDir = process.env.RIMEWRIGHT_DIST || '.next';

/** @type {import('next').NextConfig} */
const nextConfig = {
  distDir,
  reactStrictMode: true,
  reactCompiler: true,
  typedRoutes: true,
  poweredByHeader: false,
  // Sequelize asks for optional dialects at run time; bundling it would stop the build.
  serverExternalPackages: ['sequelize', 'pg', 'pg-boss', 'pg-copy-streams'],
  // Types are checked by `npm run types`, which .ci/run calls before the build.
  typescript: {
    ignoreBuildErrors: process.env.RIMEWRIGHT_TYPES_CHECKED === '1',
    tsconfigPath: distDir === '.next' ? 'tsconfig.json' : 'tsconfig.spare.json',
  },
  turbopack: { root: path.dirname(fileURLToPath(import.meta.url)) },
  experimental: { serverActions: { bodySizeLimit: '1mb' } },
  async headers() {
    return [
      {
        source: '/(.*)',
        headers: [
          { key: 'X-Content-Type-Options', value: 'nosniff' },
          { key: 'X-Frame-Options', value: 'DENY' },
          { key: 'Referrer-Policy', value: 'same-origin' },
          { key: 'Permissions-Policy', value: 'geolocation=(self), camera=(), microphone=()' },
        ],
      },
    ];
  },
};

export default nextConfig;
