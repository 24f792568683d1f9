import type { ProductionKind } from "@/db/enums";
import { defaultSetup, type Setup } from "@/render/scene/setup";

/** What a new shot begins with: FIELD §2's defaults, and for a dome its lens, raster and rate (FIELD §2, "Fulldome"). */
export function firstSetup(kind: ProductionKind): Setup {
  if (kind === "film") return defaultSetup;
  const lens = { kind: "dome", fieldDeg: 180, tiltDeg: 0 } as const;
  return {
    ...defaultSetup,
    camera: { ...defaultSetup.camera, lens },
    time: { rate: { numerator: 30, denominator: 1 }, first: 1, last: 30 },
    picture: { ...defaultSetup.picture, width: 1024, height: 1024 },
  };
}
