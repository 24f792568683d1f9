"use client";

import { parseAsInteger, useQueryState } from "nuqs";
import { NuqsAdapter } from "nuqs/adapters/next/app";
import type { VersionPage as Version } from "@/lib/versions/schema";
import { useChanges } from "../live/use-changes";
import { Certificate } from "./certificate";
import { FileTable, type FilePage } from "./file-table";
import { FrameRuler } from "./frame-ruler";
import { History } from "./history";
import { Plate } from "./plate";
import { RenderState } from "./render-state";
import { VersionHead } from "./version-head";

export interface VersionPageProps {
  version: Version;
  files: FilePage;
}

/** A version: its frames, what they were made from, and everything that happened to it. */
export function VersionPage(props: VersionPageProps) {
  return (
    <NuqsAdapter>
      <Viewer {...props} />
    </NuqsAdapter>
  );
}

function Viewer({ version, files }: VersionPageProps) {
  useChanges(({ versionId, shotId, kind }) => {
    const concerns = versionId === version.id || shotId === version.shot.id;
    return concerns && kind !== "frame.progress";
  });
  const { first, last } = version;
  const within = (frame: number) => Math.min(last, Math.max(first, frame));
  const [asked, ask] = useQueryState("frame", parseAsInteger.withOptions({ history: "replace" }));
  const frame = within(asked ?? version.finished[0]?.first ?? first);
  const showFrame = (next: number) => void ask(within(next));
  return (
    <div className="mx-auto w-full max-w-1920 px-16 pb-48 sm:px-24">
      <VersionHead version={version} />
      <p className="type-note pb-16 text-text">{version.shot.brief}</p>
      <div className="grid gap-x-32 gap-y-24 lg:grid-cols-[320px_minmax(0,1fr)] xl:grid-cols-[400px_minmax(0,1fr)]">
        <div className="order-last grid min-w-0 content-start gap-24 lg:order-none">
          <Certificate version={version} />
          <History version={version} />
        </div>
        <div className="min-w-0">
          <RenderState version={version} />
          <Plate version={version} frame={frame} onFrame={showFrame} />
          <FrameRuler version={version} frame={frame} onFrame={showFrame} />
          <div className="mt-24">
            <FileTable key={files.files.length} versionId={version.id} page={files} />
          </div>
        </div>
      </div>
    </div>
  );
}
