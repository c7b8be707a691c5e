/** @type {import('next').NextConfig} */
const config = {
  serverExternalPackages: ["knex"],
  agentRules: false,
  turbopack: { root: import.meta.dirname },
  outputFileTracingRoot: import.meta.dirname,
  poweredByHeader: false,
  allowedDevOrigins: ["127.0.0.1"],
};
export default config;
