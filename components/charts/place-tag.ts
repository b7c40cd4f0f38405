/** A region that a tag should not cover; `weight` says how much it matters. */
export interface Obstacle {
  x0: number;
  x1: number;
  y0: number;
  y1: number;
  weight: number;
}
export interface TagRoom {
  left: number;
  right: number;
  top: number;
  bottom: number;
}

const OFF = 8;
const SIDE = 3;
/** Cost of one px away from the value, against one px² of a covered trace. */
const FAR = 0.6;

const overlap = (a0: number, a1: number, b0: number, b1: number) => Math.max(0, Math.min(a1, b1) - Math.max(a0, b0));

/** Puts the tag of a reading beside its ring, where it covers least of traces, ratings and words. */
export const placeTag = (x: number, y: number, width: number, height: number, room: TagRoom, obstacles: readonly Obstacle[]): { x: number; y: number } => {
  const clamp = (at: number) => Math.min(Math.max(at, room.top + 1), room.bottom - height - 1);
  const heights = [y - height - SIDE, y + SIDE, y - height - 16, y + 16, room.top + 1, room.bottom - height - 1, (room.top + room.bottom - height) / 2].map(clamp);
  const sides = [x + OFF, x - OFF - width].filter((at) => at >= room.left && at + width <= room.right);
  let best = { x: sides[0] ?? Math.max(room.left, room.right - width), y: heights[0]!, cost: Infinity };
  for (const side of sides) {
    for (const top of heights) {
      const covered = obstacles.reduce((sum, one) => sum + one.weight * overlap(side, side + width, one.x0, one.x1) * overlap(top, top + height, one.y0, one.y1), 0);
      const cost = covered + FAR * Math.abs(top + height / 2 - y) + (side < x ? SIDE : 0);
      if (cost < best.cost) best = { x: side, y: top, cost };
    }
  }
  return { x: best.x, y: best.y };
};

/** A curve as a row of boxes. */
export const obstaclesOf = (x: readonly number[], y: readonly number[], weight: number, column = 6): Obstacle[] => {
  const boxes: Obstacle[] = [];
  x.forEach((at, index) => {
    const height = y[index]!;
    const last = boxes[boxes.length - 1];
    if (last && at < last.x0 + column) {
      last.x1 = at;
      last.y0 = Math.min(last.y0, height - 2);
      last.y1 = Math.max(last.y1, height + 2);
    } else {
      if (last) last.x1 = at;
      boxes.push({ x0: at, x1: at + 1, y0: height - 2, y1: height + 2, weight });
    }
  });
  return boxes;
};
