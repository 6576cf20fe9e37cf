/** x0, y0, x1, y1 in mm of paper, y down. */
export type Box = readonly [number, number, number, number];

/** True where the boxes, each pair `apart` mm from touching, overlap. */
export function boxesMeet(a: Box, b: Box, apart = 0): boolean {
  return a[0] < b[2] + apart && b[0] < a[2] + apart && a[1] < b[3] + apart && b[1] < a[3] + apart;
}

/** The least box round all; null for none. */
export function boxAround(boxes: readonly Box[]): Box | null {
  const first = boxes[0];
  if (!first) return null;
  let [x0, y0, x1, y1] = first;
  for (const box of boxes) {
    x0 = Math.min(x0, box[0]);
    y0 = Math.min(y0, box[1]);
    x1 = Math.max(x1, box[2]);
    y1 = Math.max(y1, box[3]);
  }
  return [x0, y0, x1, y1];
}

/** The box grown by `by` on every side. */
export function growBox(box: Box, by: number): Box {
  return [box[0] - by, box[1] - by, box[2] + by, box[3] + by];
}

/** True where `inner` lies wholly inside `outer`. */
export function boxInside(inner: Box, outer: Box, slack = 0): boolean {
  return (
    inner[0] >= outer[0] - slack &&
    inner[1] >= outer[1] - slack &&
    inner[2] <= outer[2] + slack &&
    inner[3] <= outer[3] + slack
  );
}
