"use client";

import NextImage from "next/image";
import { useEffect, useMemo, useState, type KeyboardEvent } from "react";
import type { VersionPage } from "@/lib/versions/schema";
import { TextAction } from "../button/text-action";
import { framePath } from "./frame-path";
import { dragHandlers, usePlate } from "./use-plate";
import { placePicture } from "./zoom";

export interface PlateProps {
  version: VersionPage;
  frame: number;
  onFrame: (frame: number) => void;
}

/** The frame: fitted, pixel for pixel, closer or farther, moved by hand or by keys while it has the focus. */
export function Plate({ version, frame, onFrame }: PlateProps) {
  const { width, height } = version.setup.picture;
  const picture = useMemo(() => ({ width, height }), [width, height]);
  const { ref, plate, view, isWhole, fit, pixelForPixel, zoom, pan } = usePlate(picture);
  const finished = version.finished.some(({ first, last }) => frame >= first && frame <= last);
  const shown = useShownFrame(version.id, frame, finished);
  const acts: Record<string, () => void> = {
    ArrowLeft: () => onFrame(frame - 1),
    ArrowRight: () => onFrame(frame + 1),
    Home: () => onFrame(version.first),
    End: () => onFrame(version.last),
    f: fit,
    p: pixelForPixel,
    "+": () => zoom(1.5),
    "=": () => zoom(1.5),
    "-": () => zoom(1 / 1.5),
  };
  const pans: Record<string, () => void> = {
    ArrowLeft: () => pan(48, 0),
    ArrowRight: () => pan(-48, 0),
    ArrowUp: () => pan(0, 48),
    ArrowDown: () => pan(0, -48),
  };
  const pressKey = (event: KeyboardEvent) => {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    const act = (event.shiftKey && pans[event.key]) || acts[event.key];
    if (!act) return;
    event.preventDefault();
    act();
  };
  return (
    <div>
      <div className="type-label flex flex-wrap items-baseline justify-between gap-x-16 gap-y-4 pb-8 text-soft">
        <span>
          Frame <span className="type-figure text-bright">{frame}</span> of {version.first}–{version.last}
        </span>
        <span className="flex flex-wrap gap-x-16">
          <TextAction onClick={fit} aria-pressed={isWhole} aria-keyshortcuts="F">
            whole
          </TextAction>
          <TextAction onClick={pixelForPixel} aria-keyshortcuts="P">
            pixel for pixel
          </TextAction>
          <TextAction onClick={() => zoom(1.5)} aria-keyshortcuts="+">
            closer
          </TextAction>
          <TextAction onClick={() => zoom(1 / 1.5)} aria-keyshortcuts="-">
            farther
          </TextAction>
          <span className="type-figure min-w-48 text-right" aria-live="polite">
            {Math.round(view.scale * 100)} %
          </span>
        </span>
      </div>
      <div
        ref={ref}
        role="group"
        tabIndex={0}
        aria-label={`The frame. Arrow keys change the frame, with Shift they move the picture; F shows the whole, P pixel for pixel, plus and minus come closer and go farther.`}
        onKeyDown={pressKey}
        {...dragHandlers(pan)}
        className="relative max-h-[max(280px,calc(100dvh-330px))] w-full cursor-grab touch-pinch-zoom overflow-hidden bg-sunk select-none active:cursor-grabbing"
        style={{ aspectRatio: `${width} / ${height}` }}
      >
        {shown !== null && (
          <Picture version={version} frame={shown} transform={placePicture(view, plate)} scale={view.scale} />
        )}
        {!finished && (
          <p className="type-label absolute inset-x-16 top-16 text-text">{sayMissing(version, frame)}</p>
        )}
      </div>
    </div>
  );
}

interface PictureProps {
  version: VersionPage;
  frame: number;
  transform: string;
  scale: number;
}

function Picture({ version, frame, transform, scale }: PictureProps) {
  const { picture } = version.setup;
  const words = `Frame ${frame} of version ${version.number} of ${version.shot.code}. ${version.setupFacts.slice(1, 3).join(" ")}`;
  return (
    // Its own pixels matter here, so no optimiser stands between the file and the screen.
    <NextImage
      unoptimized
      src={framePath(version.id, frame, "png")}
      alt={words}
      width={picture.width}
      height={picture.height}
      draggable={false}
      className="absolute top-0 left-0 max-w-none origin-top-left"
      style={{ transform, imageRendering: scale >= 2 ? "pixelated" : "auto" }}
    />
  );
}

/** The frame to show: the asked one once it is fetched, and until then the one before, so that nothing flickers. */
function useShownFrame(versionId: string, frame: number, finished: boolean): number | null {
  const [ready, setReady] = useState<number | null>(null);
  useEffect(() => {
    if (!finished) return;
    let wanted = true;
    const image = new Image();
    image.src = framePath(versionId, frame, "png");
    void image.decode().then(
      () => wanted && setReady(frame),
      () => wanted && setReady(frame),
    );
    return () => {
      wanted = false;
    };
  }, [versionId, frame, finished]);
  return finished ? (ready ?? frame) : null;
}

function sayMissing({ render }: VersionPage, frame: number): string {
  if (render.failedFrame === frame && render.failure)
    return `Frame ${frame} was not finished. ${render.failure}`;
  if (render.state === "rendering") return `Frame ${frame} is not rendered yet.`;
  return `Frame ${frame} was not rendered.`;
}
