import { NextResponse, type NextRequest } from "next/server";
import { isTrustworthy } from "./scripts/headers.mjs";

/** Gives each page its content policy with a fresh nonce. Decides nothing about rights. */
export function proxy(request: NextRequest) {
  const policy = pagePolicy(freshNonce());
  const headers = new Headers(request.headers);
  headers.set("content-security-policy", policy);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set("content-security-policy", policy);
  return response;
}

// Left out: `api/` (a proxy cuts large bodies there), built files, the icon. Their policy is in next.config.mjs.
export const config = { matcher: ["/((?!api/|_next/static/|icon\\.svg$).*)"] };

function freshNonce(): string {
  return Buffer.from(crypto.getRandomValues(new Uint8Array(16))).toString("base64");
}

function pagePolicy(nonce: string): string {
  const developing = process.env.NODE_ENV === "development";
  const origin = process.env.STILLYARD_ORIGIN ?? "http://localhost";
  return [
    "default-src 'none'",
    `script-src 'self' 'nonce-${nonce}' 'strict-dynamic'${developing ? " 'unsafe-eval'" : ""}`,
    `style-src 'self' 'nonce-${nonce}'`,
    "img-src 'self' blob: data:",
    "font-src 'self'",
    "connect-src 'self'",
    "manifest-src 'self'",
    "worker-src 'self'",
    "form-action 'self'",
    "frame-ancestors 'none'",
    "base-uri 'none'",
    "object-src 'none'",
    ...(isTrustworthy(origin) ? ["upgrade-insecure-requests"] : []),
    "report-uri /api/csp",
  ].join("; ");
}
