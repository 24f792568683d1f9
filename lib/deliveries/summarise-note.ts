import type { Setup } from "@/render/scene/setup";
import { describeMass } from "../reviews/describe-setup";

interface Shown {
  hole: Setup["hole"] | null;
  hasDisk: boolean;
}

/** The science note in a few sentences, for the delivery's page; the whole of it is a file of the delivery. */
export function summariseNote(sets: readonly Shown[]): string {
  const holes = new Set(sets.flatMap(({ hole }) => (hole ? [nameHole(hole)] : [])));
  const around = holes.size === 1 ? [...holes].join() : "the black holes that the note names";
  const disks = sets.some(({ hasDisk }) => hasDisk);
  const computed = disks
    ? "The bending, the dark centre, the higher images and the brighter approaching side are computed."
    : "The bending, the dark centre and the shifted places of the stars are computed.";
  const chosen = disks
    ? "The camera, the disk's edges and its peak temperature, and the exposure were chosen."
    : "The camera, the sky's direction and the exposure were chosen.";
  return `The pictures follow light through the curved space around ${around}. ${computed} ${chosen}`;
}

const nameHole = ({ spin, massSolar }: Setup["hole"]) =>
  `a ${spin > 0 ? "spinning " : ""}black hole of ${describeMass(massSolar)}`;
