// Where each file stands in the package. ASCII, no spaces, a fixed order: shot, version, frame, format (FIELD §3, "Folders").
import type { FileKind } from "@/db/enums";
import type { Layout, Separator } from "./schema";

export interface Naming {
  layout: Layout;
  separator: Separator;
  digits: number;
}

interface Run {
  shotCode: string;
  number: number;
  first: number;
  last: number;
}

/** No folder holds more frames than this (FIELD §2, "Fulldome"). */
const framesPerFolder = 10_000;

export const setName = ({ shotCode, number }: Pick<Run, "shotCode" | "number">): string =>
  `${shotCode}-v${String(number).padStart(3, "0")}`;

export function framePath(run: Run, frame: number, kind: FileKind, naming: Naming): string {
  const figures = (value: number) => String(value).padStart(naming.digits, "0");
  const from = run.first + Math.floor((frame - run.first) / framesPerFolder) * framesPerFolder;
  const to = Math.min(run.last, from + framesPerFolder - 1);
  const set = setName(run);
  const folder = `${set}_${figures(from)}-${figures(to)}`;
  const folders = naming.layout === "by shot" ? `${folder}/${kind}` : `${kind}/${folder}`;
  return `frames/${folders}/${set}${naming.separator}${figures(frame)}.${kind}`;
}

/** The folder that the package unpacks into, and the name of its archive. */
export const packageName = (productionCode: string, number: number): string =>
  `${productionCode}-delivery-${String(number).padStart(3, "0")}`;
