// Before every page and handler: a script nonce, a request id, and the headers that keep other sites out. It guards nothing:
// every verb asks for authority itself.
import { NextResponse, type NextRequest } from "next/server";

const developing = process.env.NODE_ENV === "development";

export const config = { matcher: ["/((?!_next/static|_next/image).*)"] };

export function proxy(request: NextRequest): NextResponse {
  const nonce = Buffer.from(crypto.getRandomValues(new Uint8Array(16))).toString("base64");
  const policy = contentPolicy(nonce);
  const headers = new Headers(request.headers);
  headers.set("x-nonce", nonce);
  headers.set("x-request-id", requestId(request));
  headers.set("x-path", request.nextUrl.pathname + request.nextUrl.search);
  // Next reads the nonce for its own scripts from here.
  headers.set("content-security-policy", policy);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set("content-security-policy", policy);
  for (const [name, value] of fixedHeaders) response.headers.set(name, value);
  if (isSecure(request))
    response.headers.set("strict-transport-security", "max-age=31536000; includeSubDomains");
  return response;
}

function contentPolicy(nonce: string): string {
  // The development server's error overlay evaluates source maps; the built program evaluates nothing.
  const evaluation = developing ? "'unsafe-eval'" : "'wasm-unsafe-eval'";
  return [
    "default-src 'self'",
    `script-src 'self' 'nonce-${nonce}' 'strict-dynamic' ${evaluation}`,
    "style-src 'self' 'unsafe-inline'",
    "img-src 'self' blob: data:",
    "font-src 'self'",
    "worker-src 'self' blob:",
    "connect-src 'self'",
    "frame-ancestors 'none'",
    "base-uri 'none'",
    "form-action 'self'",
    "object-src 'none'",
  ].join("; ");
}

const fixedHeaders = [
  ["x-content-type-options", "nosniff"],
  ["referrer-policy", "same-origin"],
  ["permissions-policy", "camera=(), microphone=(), geolocation=(), payment=(), usb=(), display-capture=()"],
  ["cross-origin-opener-policy", "same-origin"],
  ["cross-origin-resource-policy", "same-origin"],
] as const;

/** An id a proxy before us gave, if it is a plain one; logs must not be written by strangers. */
function requestId(request: NextRequest): string {
  const given = request.headers.get("x-request-id");
  return given && /^[\w-]{8,64}$/.test(given) ? given : crypto.randomUUID();
}

function isSecure(request: NextRequest): boolean {
  const before = request.headers.get("x-forwarded-proto");
  return (before ? before.split(",")[0]!.trim() : request.nextUrl.protocol.replace(":", "")) === "https";
}
