import Image from "next/image";
import type { DeliveredSet } from "@/lib/deliveries/schema-pages";
import { Standing } from "../standing/standing";

const shown = 4;

/** A look at what is delivered. Sets without PNG files have no picture: nothing is shown that was not delivered. */
export function DoorPictures({ delivery, sets }: { delivery: string; sets: DeliveredSet[] }) {
  const pictured = sets.filter(({ pngs }) => pngs > 0).slice(0, shown);
  if (pictured.length === 0) return null;
  return (
    <ul className={`grid gap-x-16 gap-y-24 ${pictured.length > 1 ? "sm:grid-cols-2" : ""}`}>
      {pictured.map((set, index) => (
        <li key={set.version} className={index > 0 ? "hidden sm:block" : ""}>
          <figure>
            <Picture delivery={delivery} set={set} />
            <figcaption className="type-label mt-8 flex flex-wrap items-baseline gap-x-8 text-soft">
              <span className="type-figure font-medium text-text">
                {set.shotCode}
                <span className="sm:hidden">, v{set.number}</span>
              </span>
              <span className="hidden sm:inline">{set.seen}</span>
              <Standing standing="signed off" className="ml-auto sm:hidden" />
            </figcaption>
          </figure>
        </li>
      ))}
    </ul>
  );
}

function Picture({ delivery, set }: { delivery: string; set: DeliveredSet }) {
  const { width, height } = set.picture ?? { width: 16, height: 9 };
  const square = height >= width;
  return (
    <Image
      unoptimized
      src={`/api/deliveries/${delivery}/pictures/${set.version}`}
      alt={`A frame of ${set.shotCode}. ${set.seen}`}
      width={800}
      height={Math.round((800 * height) / width)}
      className={`block h-auto w-full bg-sunk ${square ? "aspect-square object-contain" : "aspect-[350/180] object-cover max-sm:aspect-[350/116]"}`}
    />
  );
}
