// The science note's standing sentences. They describe this build's engine and are changed with it.

export const computed: readonly string[] = [
  "Each pixel follows light backwards through the curved space of a spinning black hole (the Kerr solution of general relativity), by integrating the equations of motion of light. The size and shape of the dark centre, its offset and flattening, the bending of the far side of the disk above and below it, the higher images close to the dark edge, and the shifted places of the stars follow from that.",
  "The disk's brightness by radius is that of a thin, steady disk (Page and Thorne, 1974). Its gas moves on circular orbits; the shift of its light by motion and gravity is computed for each image, so the approaching side is brighter and bluer. Colours are those of black bodies at the shifted temperature, weighed by the CIE 1931 observer.",
];

export const chosen: readonly string[] = [
  "The hole's mass and spin, the camera's place, motion and lens, the disk's edges, sense and peak temperature, the direction of the sky and the exposure were chosen for the picture. They are listed for each shot below, and stand to the last figure in its setup.json.",
  "How bright the stars are beside the disk is a choice as well, and each is drawn as a small soft point. A chosen peak temperature is not compared with what the infall of gas onto such a hole would give: this build does not measure how far a picture departs from physics, and states no departure it has not measured.",
];

export const omitted: readonly string[] = [
  "The disk is flat, opaque and steady: it has no thickness, no gas inside its inner edge, no turbulence, wind or jet, and reflects no light, its own returning light included. Of its images the first three are drawn; the further ones, thinner than any before them, are left dark. Polarisation, dust on the way and the lens's own flare are left out.",
];

export const cautions: readonly string[] = [
  "No flash or motion screening was made of these frames. Flashing and fast motion can hurt people. A qualified test and the venue's own policy decide whether they may be shown.",
  "The figures are for pictures, not for flight, medical or safety use.",
];
