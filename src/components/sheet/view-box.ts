/** The part of the paper that is seen, mm. */
export interface ViewBox {
  x: number;
  y: number;
  width: number;
  height: number;
}

/** Closer than this no line says more. */
const CLOSEST = 12;

/** Scaled about a point of the paper that stays where it is; never smaller than the whole sheet. */
export function scaled(box: ViewBox, whole: ViewBox, by: number, about: { x: number; y: number }): ViewBox {
  const width = Math.min(whole.width, Math.max(whole.width / CLOSEST, box.width / by));
  const factor = width / box.width;
  return within(
    {
      x: about.x - (about.x - box.x) * factor,
      y: about.y - (about.y - box.y) * factor,
      width,
      height: box.height * factor,
    },
    whole,
  );
}

export function moved(box: ViewBox, whole: ViewBox, dx: number, dy: number): ViewBox {
  return within({ ...box, x: box.x + dx, y: box.y + dy }, whole);
}

/** So much of the paper as shows a point in its middle, at this width. */
export function centredOn(
  whole: ViewBox,
  point: { x: number; y: number },
  width: number,
  aspect: number,
): ViewBox {
  const height = width / aspect;
  return within({ x: point.x - width / 2, y: point.y - height / 2, width, height }, whole);
}

function within(box: ViewBox, whole: ViewBox): ViewBox {
  const clamp = (value: number, least: number, most: number) =>
    Math.min(Math.max(value, least), Math.max(least, most));
  return {
    ...box,
    x: clamp(box.x, whole.x, whole.x + whole.width - box.width),
    y: clamp(box.y, whole.y, whole.y + whole.height - box.height),
  };
}
