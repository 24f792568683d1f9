import Image from "next/image";
import Link from "next/link";
import type { BenchPage } from "@/lib/setups/schema";
import { framePath } from "../version/frame-path";

/** The newest version's first finished frame: what the setup last looked like, not what it looks like now. */
export function NewestFrame({ page: { versions, setup, shot } }: { page: BenchPage }) {
  const version = versions.find(({ firstFinished }) => firstFinished !== null);
  if (!version || version.firstFinished === null) return null;
  const { width, height } = setup.picture;
  return (
    <figure className="min-w-0">
      <Link href={`/versions/${version.id}`}>
        <Image
          unoptimized
          loading="eager"
          src={framePath(version.id, version.firstFinished, "png")}
          alt={`Frame ${version.firstFinished} of version ${version.number} of ${shot.code}`}
          width={width}
          height={height}
          className="block max-h-420 w-full bg-sunk object-contain"
        />
      </Link>
      <figcaption className="type-small mt-4 text-soft">
        Frame {version.firstFinished} of version {version.number}, as its own setup was.
      </figcaption>
    </figure>
  );
}
