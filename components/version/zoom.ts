// Where a picture stands in its plate. Lengths in CSS pixels; the picture's own in picture pixels.
export interface Size {
  width: number;
  height: number;
}

/** The scale, in CSS pixels a picture pixel, and the picture's point in the middle of the plate. */
export interface View {
  scale: number;
  x: number;
  y: number;
}

const farthest = 1 / 16;
const closest = 32;

/** The whole picture, as large as the plate allows. */
export function fitView(plate: Size, picture: Size): View {
  const scale = Math.min(plate.width / picture.width, plate.height / picture.height);
  return { scale, x: picture.width / 2, y: picture.height / 2 };
}

/** Keeps the picture from leaving the plate: its middle point stays within it. */
function hold(view: View, picture: Size): View {
  const within = (value: number, most: number) => Math.min(most, Math.max(0, value));
  return { ...view, x: within(view.x, picture.width), y: within(view.y, picture.height) };
}

/** Closer or farther by a factor; the picture's point that is `off` from the plate's middle stays where it is. */
export function zoomBy(view: View, picture: Size, factor: number, off = { x: 0, y: 0 }): View {
  const scale = Math.min(closest, Math.max(farthest, view.scale * factor));
  const shift = 1 / view.scale - 1 / scale;
  return hold({ scale, x: view.x + off.x * shift, y: view.y + off.y * shift }, picture);
}

/** The picture moved along with a pointer, by CSS pixels. */
export function panBy(view: View, picture: Size, x: number, y: number): View {
  return hold({ ...view, x: view.x - x / view.scale, y: view.y - y / view.scale }, picture);
}

/** The CSS transform of a picture whose top left corner stands in the plate's. */
export function placePicture({ scale, x, y }: View, plate: Size): string {
  return `translate(${plate.width / 2 - x * scale}px, ${plate.height / 2 - y * scale}px) scale(${scale})`;
}
