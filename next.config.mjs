/** @type {import("next").NextConfig} */
const config = {
  reactStrictMode: true,
  poweredByHeader: false,
  // Native and socket-holding packages stay plain Node modules.
  serverExternalPackages: ["sequelize", "mariadb", "@node-rs/argon2", "pino"],
  // npm test checks the types, of the tests too; a type error there must not keep the product from starting.
  typescript: { ignoreBuildErrors: true },
  agentRules: false,
  experimental: { agentUpgrade: false },
  // scripts/test.ts builds beside a running `npm start` without disturbing it.
  distDir: process.env.NEXT_DIST_DIR || ".next",
};
export default config;
