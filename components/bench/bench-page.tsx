"use client";

import type { BenchPage as Page } from "@/lib/setups/schema";
import { useChanges } from "../live/use-changes";
import { CameraColumn } from "./camera-column";
import { DiskColumn } from "./disk-column";
import { HoleColumn } from "./hole-column";
import { NewestFrame } from "./newest-frame";
import { PictureColumn, SkyColumn } from "./picture-column";
import { RenderBar } from "./render-bar";
import { Conflict, SaveLine } from "./save-line";
import { TimeColumn } from "./time-column";
import { useAutosave } from "./use-autosave";
import { useSlip } from "./use-slip";
import { VersionList } from "./version-list";

/** A shot's setup as a slip of fields, its versions, and the way to the next one. */
export function BenchPage({ page }: { page: Page }) {
  const { shot, reader } = page;
  useChanges(({ shotId, kind, byId }) => {
    if (shotId !== shot.id || kind === "frame.progress") return false;
    return kind !== "setup.saved" || byId !== reader.id;
  });
  const slip = useSlip(page.setup, !page.may.save);
  const { state, flush, saveOver, takeTheirs } = useAutosave(page, slip.values);
  const empty = page.versions.every(({ firstFinished }) => firstFinished === null);
  return (
    <div className="mx-auto w-full max-w-1920 px-16 sm:px-24">
      <header className="flex flex-wrap items-baseline gap-x-36 gap-y-4 py-12">
        <h1 className="type-code text-text">{shot.code}</h1>
        <p className="type-prose min-w-0 flex-1 basis-full text-text sm:basis-0">{shot.brief}</p>
        <SaveLine page={page} state={state} />
      </header>
      {state.kind === "conflict" && (
        <Conflict
          message={state.message}
          onKeep={saveOver}
          onTakeTheirs={async () => slip.form.reset(await takeTheirs())}
        />
      )}
      <div className={`grid gap-24 pb-24 ${empty ? "" : "lg:grid-cols-[minmax(0,1fr)_min(776px,60%)]"}`}>
        <VersionList page={page} />
        <NewestFrame page={page} />
      </div>
      <div className="grid gap-x-24 gap-y-36 pb-36 sm:grid-cols-2 lg:grid-cols-4">
        <div className="grid min-w-0 content-start gap-36">
          <HoleColumn slip={slip} />
          <TimeColumn slip={slip} />
        </div>
        <CameraColumn slip={slip} />
        <DiskColumn slip={slip} />
        <div className="grid min-w-0 content-start gap-36">
          <PictureColumn slip={slip} />
          <SkyColumn slip={slip} />
        </div>
      </div>
      {page.may.render && <RenderBar page={page} values={slip.values} flush={flush} />}
    </div>
  );
}
