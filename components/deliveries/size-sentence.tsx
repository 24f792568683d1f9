"use client";

import { useEffect, useState } from "react";
import { measureDeliverySchema } from "@/lib/deliveries/schema";
import { sayBytes } from "@/lib/deliveries/schema-bytes";
import type { DeliverySize } from "@/lib/deliveries/schema-pages";
import { requestJson } from "../api/request";
import { Figure } from "../figure/figure";

type Answer = { asked: string; size?: DeliverySize; refusal?: string };

/** How many files and bytes the delivery will hold, and how the first will be named, as the choices stand. */
export function SizeSentence({ choice }: { choice: unknown }) {
  const wanted = measureDeliverySchema.safeParse(choice);
  const asked = wanted.success ? JSON.stringify(wanted.data) : null;
  const answer = useSize(asked);
  if (asked === null)
    return <p className="type-body text-soft">Its size stands here once something is chosen.</p>;
  if (answer?.asked !== asked) return <p className="type-body text-soft">Measuring…</p>;
  if (!answer.size) return <p className="type-body text-ember">{answer.refusal}</p>;
  const { files, bytes, sizes } = answer.size;
  return (
    <p className="type-body text-text" aria-live="polite">
      It will hold <Figure bright>{files}</Figure> files, <Figure bright>{sayBytes(bytes)}</Figure>.{" "}
      <span className="break-all text-soft">
        The first is named <Figure className="whitespace-normal">{sizes[0]?.firstPath}</Figure>
      </span>
    </p>
  );
}

function useSize(asked: string | null): Answer | undefined {
  const [answer, setAnswer] = useState<Answer>();
  useEffect(() => {
    if (asked === null) return;
    const stop = new AbortController();
    const wait = setTimeout(() => {
      requestJson<DeliverySize>("/api/deliveries/size", {
        body: JSON.parse(asked),
        signal: stop.signal,
      }).then(
        (size) => setAnswer({ asked, size }),
        (error: Error) => stop.signal.aborted || setAnswer({ asked, refusal: error.message }),
      );
    }, 250);
    return () => {
      clearTimeout(wait);
      stop.abort();
    };
  }, [asked]);
  return answer;
}
