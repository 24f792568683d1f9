import { describe, expect, it } from "vitest";
import { missingRuns } from "@/components/version/frame-ruler";
import { fitView, panBy, placePicture, zoomBy } from "@/components/version/zoom";

const picture = { width: 2000, height: 1000 };
const plate = { width: 800, height: 500 };

describe("a picture in its plate", () => {
  it("fits whole, in the middle", () => {
    expect(fitView(plate, picture)).toEqual({ scale: 0.4, x: 1000, y: 500 });
    expect(placePicture(fitView(plate, picture), plate)).toBe("translate(0px, 50px) scale(0.4)");
  });

  it("keeps the point under the pointer where it is while zooming", () => {
    const view = fitView(plate, picture);
    const off = { x: 120, y: -80 };
    const under = ({ scale, x, y }: typeof view) => ({ x: x + off.x / scale, y: y + off.y / scale });
    const closer = zoomBy(view, picture, 1.7, off);
    expect(under(closer).x).toBeCloseTo(under(view).x, 9);
    expect(under(closer).y).toBeCloseTo(under(view).y, 9);
  });

  it("never loses the picture, however far it is moved or zoomed", () => {
    const far = panBy(fitView(plate, picture), picture, 1e6, -1e6);
    expect([far.x, far.y]).toEqual([0, 1000]);
    expect(zoomBy(far, picture, 1e9).scale).toBe(32);
    expect(zoomBy(far, picture, 1e-9).scale).toBe(1 / 16);
  });
});

describe("the frames that are missing", () => {
  it("are the stretches between finished ones, half a frame to each side", () => {
    const finished = [
      { first: 1001, last: 1002 },
      { first: 1005, last: 1006 },
    ];
    expect(missingRuns(1001, 1008, finished)).toEqual([
      { from: 1002.5, to: 1004.5 },
      { from: 1006.5, to: 1008 },
    ]);
    expect(missingRuns(1001, 1008, [{ first: 1001, last: 1008 }])).toEqual([]);
    expect(missingRuns(1001, 1008, [])).toEqual([{ from: 1001, to: 1008 }]);
  });
});
