import type { Subscriber } from "@/lib/events/subscriptions";

const heartbeatMs = 15_000;

type Subscribe = (subscriber: Subscriber) => Promise<() => void>;

/** A stream of server-sent events that ends when the reader leaves. A line now and then keeps proxies from closing it. */
export function eventStream(left: AbortSignal, subscribe: Subscribe): Response {
  const encoder = new TextEncoder();
  let finish = () => {};
  const body = new ReadableStream<Uint8Array>({
    async start(controller) {
      const write = (text: string) => controller.enqueue(encoder.encode(text));
      let over = false;
      let unsubscribe = () => {};
      const heartbeat = setInterval(() => write(": still here\n\n"), heartbeatMs);
      finish = () => {
        if (over) return;
        over = true;
        clearInterval(heartbeat);
        unsubscribe();
        controller.close();
      };
      left.addEventListener("abort", () => finish(), { once: true });
      write("retry: 2000\n\n");
      unsubscribe = await subscribe({
        send: (change) => !over && write(`data: ${JSON.stringify(change)}\n\n`),
        end: () => finish(),
      });
      if (over) unsubscribe();
    },
    cancel: () => finish(),
  });
  return new Response(body, {
    headers: {
      "content-type": "text/event-stream; charset=utf-8",
      "cache-control": "no-store",
      "x-accel-buffering": "no",
    },
  });
}
