import { readdirSync, readFileSync } from "node:fs";
import { dirname, join } from "node:path";

export interface Route {
  method: string;
  /** The path with its segments still in brackets, as /api/shots/[shot]. */
  path: string;
}

const open = new Set(["/api/auth/[...nextauth]", "/api/health", "/api/ready"]);

/** Every handler of the API as it stands in the tree, so that a new one is checked without being listed. */
export function listRoutes(): Route[] {
  const files = readdirSync("app/api", { recursive: true, encoding: "utf8" }).filter((file) =>
    file.endsWith("route.ts"),
  );
  return files.flatMap((name) => {
    const file = join("app/api", name);
    const path = `/${dirname(file)}`.replace(/^\/app/, "");
    if (open.has(path)) return [];
    const source = readFileSync(file, "utf8");
    return [...source.matchAll(/export const (GET|POST|PUT|PATCH|DELETE)\b/g)].map(([, method]) => ({
      method: method!,
      path,
    }));
  });
}

/** Routes that people use before they have signed in. */
export const beforeSignIn = ({ path }: Route): boolean =>
  /\/api\/(resets|invitations\/acceptance)/.test(path);

/** The path with each segment filled from `values`, or with a well-formed value that names nothing. */
export function fill(path: string, values: Record<string, string> = {}): string {
  return path.replace(/\[(?:\.\.\.)?(\w+)\]/g, (_, name: string) => values[name] ?? nothing(name));
}

function nothing(name: string): string {
  if (name === "frame") return "1001";
  if (name === "kind") return "png";
  return name === "path" ? "README.txt" : "00000000-0000-4000-8000-000000000000";
}
