/** Headers every answer carries, whoever writes it: a page, a route, or the server's own refusal. */
export const securityHeaders = {
  "X-Content-Type-Options": "nosniff",
  "Referrer-Policy": "same-origin",
  "Cross-Origin-Opener-Policy": "same-origin",
  "Cross-Origin-Resource-Policy": "same-origin",
  "Permissions-Policy": "camera=(self), microphone=(), geolocation=()",
};

/** Policy of an answer that is never a page: nothing may run, nothing may frame it. */
export const sealedPolicy = "default-src 'none'; frame-ancestors 'none'";

export const strictTransport = "max-age=63072000; includeSubDomains";

/** Whether an address can only be opened on this very machine. */
export function isLoopback(origin) {
  return /^(localhost|127(\.\d+){3}|\[::1\])$/.test(new URL(origin).hostname);
}

/** Whether browsers treat the address as secure: https, or this very machine. */
export function isTrustworthy(origin) {
  return new URL(origin).protocol === "https:" || isLoopback(origin);
}
