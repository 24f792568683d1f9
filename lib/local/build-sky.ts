// Turns d3-celestial's star data into our compact catalogue, public/sky/stars.bin, and lays its licence beside it.
import { mkdir, readFile, rename, writeFile } from "node:fs/promises";
import { createRequire } from "node:module";
import path from "node:path";
import { fileURLToPath, pathToFileURL } from "node:url";
import { z } from "zod";
import { encodeCatalogue, type Star } from "../../render/sky/catalogue";

// Fifty-two stars of the source have no colour index; they are drawn as white as the Sun.
const unknownColourIndex = 0.65;

const sourceSchema = z.object({
  features: z.array(
    z.object({
      properties: z.object({ mag: z.number(), bv: z.string() }),
      geometry: z.object({ coordinates: z.tuple([z.number(), z.number()]) }),
    }),
  ),
});

const notice = `The star catalogue in this folder, stars.bin, is made from data/stars.8.json of d3-celestial (its licence follows).
That file is drawn from XHIP: An Extended Hipparcos Compilation, Anderson E., Francis C. (2012), VizieR V/137D.
Kept: position (ICRS, degrees), V magnitude, B-V. Changed: rounded into a binary form; no star left out.

`;

/** The stars of d3-celestial's GeoJSON: longitude is right ascension, latitude declination. */
export function starsFromSource(text: string): Star[] {
  return sourceSchema.parse(JSON.parse(text)).features.map(({ properties, geometry }) => ({
    raDeg: geometry.coordinates[0],
    decDeg: geometry.coordinates[1],
    magnitude: properties.mag,
    colourIndex: properties.bv === "" ? unknownColourIndex : Number(properties.bv),
  }));
}

/** Writes the catalogue and its licence into `folder`, each in one piece; returns the number of stars. */
export async function buildSky(folder: string): Promise<number> {
  const source = path.dirname(createRequire(import.meta.url).resolve("d3-celestial/package.json"));
  const stars = starsFromSource(await readFile(path.join(source, "data", "stars.8.json"), "utf8"));
  const licence = notice + (await readFile(path.join(source, "LICENSE"), "utf8"));
  await mkdir(folder, { recursive: true });
  await writeWhole(path.join(folder, "LICENSE"), licence);
  await writeWhole(path.join(folder, "stars.bin"), encodeCatalogue(stars));
  return stars.length;
}

async function writeWhole(file: string, content: string | Uint8Array): Promise<void> {
  const partial = `${file}.${process.pid}.partial`;
  await writeFile(partial, content);
  await rename(partial, file);
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? "").href) {
  const folder = fileURLToPath(new URL("../../public/sky", import.meta.url));
  const count = await buildSky(folder);
  console.log(`${count} stars written to public/sky/stars.bin.`);
}
