/** @type {import('next').NextConfig} */
const config = {
  typedRoutes: true,
  reactStrictMode: true,
  poweredByHeader: false,
  // `next dev` may be opened by either name of this machine.
  allowedDevOrigins: ["127.0.0.1", "localhost"],
  // The badge of the development server would lie over the bottom bar.
  devIndicators: false,
  experimental: { authInterrupts: true, serverActions: { bodySizeLimit: "256kb" } },
  serverExternalPackages: ["@libsql/client", "pino"],
};

export default config;
