import { fileURLToPath } from "node:url";
import { securityHeaders, sealedPolicy } from "./scripts/headers.mjs";

const root = fileURLToPath(new URL(".", import.meta.url));
const headersOf = (list) => Object.entries(list).map(([key, value]) => ({ key, value }));

/** Answers the page policy of proxy.ts does not reach: data, built files, the icon. */
const sealed = headersOf({ "Content-Security-Policy": sealedPolicy });

/** @type {import("next").NextConfig} */
const config = {
  agentRules: false,
  // A second folder lets tests build new sources beside a served product.
  distDir: process.env.STILLYARD_BUILD_FOLDER ?? ".next",
  images: { unoptimized: true },
  outputFileTracingRoot: root,
  poweredByHeader: false,
  reactStrictMode: true,
  serverExternalPackages: ["sequelize"],
  turbopack: { root },
  // Types are a step of their own in `npm test`.
  typescript: { ignoreBuildErrors: true },
  headers: async () => [
    { source: "/:path*", headers: headersOf(securityHeaders) },
    { source: "/api/:path*", headers: [...sealed, ...headersOf({ "Cache-Control": "private, no-store" })] },
    { source: "/_next/static/:path*", headers: sealed },
    { source: "/icon.svg", headers: sealed },
  ],
};

export default config;
