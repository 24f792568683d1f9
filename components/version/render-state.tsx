"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import type { VersionPage } from "@/lib/versions/schema";
import { requestJson } from "../api/request";
import { Button } from "../button/button";
import { TextAction } from "../button/text-action";
import { useChanges } from "../live/use-changes";
import { Message } from "../message/message";
import { ProgressRuler } from "../ruler/progress-ruler";
import { sayDuration } from "../shots/say";

/** How the rendering stands while it is not whole: progress as it happens, or why it stopped; cancel and resume. */
export function RenderState({ version }: { version: VersionPage }) {
  const { render, first, last, viewer } = version;
  const under = useFrameInHand(version.id);
  const { act, refusal, busy } = useActs(version.id);
  if (render.state === "complete") return null;

  const of = last - first + 1;
  const done = version.finished.reduce((sum, run) => sum + run.last - run.first + 1, 0);
  const said = `${done} of ${of} ${of === 1 ? "frame" : "frames"}`;
  if (render.state === "rendering")
    return (
      <section aria-label="Rendering" className="mb-24 grid gap-8">
        <div className="type-body flex flex-wrap items-baseline justify-between gap-x-16 text-text">
          <span aria-live="polite">
            {said} rendered
            {render.milliseconds > 0 && `, ${sayDuration(render.milliseconds)} of machine time`}.{" "}
            <span className="text-soft">{under && `Frame ${under.frame}: ${under.percent} % done.`}</span>
          </span>
          {viewer.mayCancel && (
            <TextAction onClick={() => void act("cancel")}>Cancel the rendering</TextAction>
          )}
        </div>
        <ProgressRuler
          label="frames rendered, per cent"
          value={(100 * (done + shareOf(under))) / of}
          max={100}
          spoken={said}
          tone="text"
        />
        {refusal && <Message kind="work">{refusal}</Message>}
      </section>
    );
  return (
    <Message
      kind="work"
      announce={false}
      className="mb-24 flex flex-wrap items-center justify-between gap-12"
    >
      <span>
        {sayStopped(version)} {said} {done === 1 ? "is" : "are"} kept.
        {refusal && <span className="mt-4 block text-ember">{refusal}</span>}
      </span>
      {viewer.mayResume && (
        <Button busy={busy} onClick={() => void act("resume")}>
          Resume
        </Button>
      )}
    </Message>
  );
}

function sayStopped({ render, kernel, kernelHere }: VersionPage): string {
  const why = render.failure ? ` ${render.failure}` : "";
  const other =
    kernel === kernelHere
      ? ""
      : ` It was begun with kernel ${kernel} and the studio now has ${kernelHere}, so it cannot be resumed: render a new version.`;
  if (render.state === "cancelled") return `The rendering was cancelled.${other}`;
  return `The rendering stopped at frame ${render.failedFrame}.${why}${other}`;
}

interface FrameInHand {
  frame: number;
  percent: number;
}

const shareOf = (under: FrameInHand | null) => (under ? under.percent / 100 : 0);

/** The frame being rendered and how much of it is done, as the worker tells. */
function useFrameInHand(versionId: string): FrameInHand | null {
  const [under, setUnder] = useState<FrameInHand | null>(null);
  useChanges(
    (change) => change.versionId === versionId,
    ({ kind, frame, percent }) =>
      setUnder(kind === "frame.progress" ? { frame: Number(frame), percent: Number(percent) } : null),
  );
  return under;
}

function useActs(versionId: string) {
  const router = useRouter();
  const [refusal, setRefusal] = useState<string>();
  const [busy, setBusy] = useState(false);
  const act = async (what: "cancel" | "resume") => {
    setBusy(true);
    setRefusal(undefined);
    try {
      await requestJson(`/api/versions/${versionId}/${what}`, { method: "POST" });
    } catch (error) {
      setRefusal((error as Error).message);
    }
    setBusy(false);
    router.refresh();
  };
  return { act, refusal, busy };
}
