import { handle } from "@/app/handle";
import { exportLog } from "@/lib/events/export-log";
import { exportLogInput } from "@/lib/events/schema";

export const GET = handle(exportLogInput, async (ctx, input) => {
  const text = await exportLog(ctx, input);
  return new Response(text, {
    headers: {
      "content-type": "text/plain; charset=utf-8",
      "content-disposition": `attachment; filename="ringwright-log-${input.production}.txt"`,
    },
  });
});
