// Which thing did a finger mean in the picture? The nearest within reach; several within reach are all offered.

export const REACH = 32;

/**
 * @template {{x:number, y:number}} T
 * @param {T[]} points in CSS pixels @param {number} x @param {number} y @param {number} [reach]
 * @returns {T[]} nearest first
 */
export function within(points, x, y, reach = REACH) {
  return points.map((point) => ({ point, away: Math.hypot(point.x - x, point.y - y) }))
    .filter((one) => one.away <= reach).sort((a, b) => a.away - b.away).map((one) => one.point);
}
