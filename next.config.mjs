/** @type {import('next').NextConfig} */
const config = {
  serverExternalPackages: ["knex"],
  // The largest body that a route takes (a STEP file) must get past the proxy whole.
  experimental: { proxyClientMaxBodySize: 52_000_000 },
  agentRules: false,
  turbopack: { root: import.meta.dirname },
  outputFileTracingRoot: import.meta.dirname,
  poweredByHeader: false,
  allowedDevOrigins: ["127.0.0.1"],
};
export default config;
