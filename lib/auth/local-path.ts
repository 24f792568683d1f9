/** Where to go after signing in: a path of ours, whatever the address said. A link to another site is never followed. */
export function localPath(wanted: unknown): string {
  const home = "/";
  // Browsers drop control characters and read a backslash as a slash, so neither may stand in a path we follow.
  if (typeof wanted !== "string" || !/^\/(?!\/)[^\\\p{Cc}]*$/u.test(wanted)) return home;
  const url = new URL(wanted, "http://ringwright.invalid");
  if (url.host !== "ringwright.invalid" || url.pathname === "/sign-in") return home;
  return url.pathname + url.search + url.hash;
}
