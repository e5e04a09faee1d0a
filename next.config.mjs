/** @type {import('next').NextConfig} */
const config = {
  typedRoutes: true,
  reactStrictMode: true,
  poweredByHeader: false,
  // `next dev` may be opened by either name of this machine.
  allowedDevOrigins: ["127.0.0.1", "localhost"],
  experimental: { authInterrupts: true },
  serverExternalPackages: ["@libsql/client", "pino"],
};

export default config;
