import Image from "next/image";

export interface ThumbnailProps {
  /** Absent while no frame exists: the place is kept, dashed. */
  src?: string | null | undefined;
  /** What the picture shows; empty where a title beside it says so. */
  alt: string;
  width: number;
  height: number;
  className?: string;
}

/** A frame, small, without ornament. Served as it is by its own route, never through the optimiser's shared cache. */
export function Thumbnail({ src, alt, width, height, className = "" }: ThumbnailProps) {
  const size = { width, height };
  if (!src)
    return (
      <span
        aria-hidden="true"
        className={`block border border-dashed border-rule ${className}`}
        style={size}
      />
    );
  return (
    <Image
      unoptimized
      src={src}
      alt={alt}
      {...size}
      className={`block bg-sunk object-cover ${className}`}
      style={size}
    />
  );
}
