import { database } from "@/lib/database";
import { checkReady } from "@/lib/health/check-ready";

export const dynamic = "force-dynamic";

export async function GET(): Promise<Response> {
  const parts = await checkReady(database());
  const ready = parts.every((part) => part.ready);
  const words = ready
    ? "Ready."
    : parts
        .filter((part) => !part.ready)
        .map((part) => part.words)
        .join(" ");
  return Response.json({ ready, words, parts }, { status: ready ? 200 : 503 });
}
