/** @type {import('next').NextConfig} */
const config = {
  poweredByHeader: false,
  reactStrictMode: true,
  // `forbidden()` answers a page with 403 and app/forbidden.tsx.
  experimental: { authInterrupts: true },
  // Bundled, Sequelize's models fail at run time with "not a subclass of Sequelize.Model".
  serverExternalPackages: ["sequelize", "pg", "pg-hstore", "umzug", "rate-limiter-flexible", "pino", "bcryptjs"],
};

export default config;
