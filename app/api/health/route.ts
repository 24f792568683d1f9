export const dynamic = "force-dynamic";

/** The process is alive; it says nothing of what it depends on (see /api/ready). */
export function GET(): Response {
  return Response.json({ alive: true, words: "The process is alive." });
}
