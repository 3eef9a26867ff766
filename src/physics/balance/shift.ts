/**
 * Levelling by moving a weight that is carried anyway.
 *
 *   shift of the CG = mass moved × distance / total mass;  so to level, distance = −q_x / mass moved.
 *
 * Source: FAA-H-8083-1, shifting of weight. Height of the part is taken as unchanged.
 */

/** How far a weight must move aft (+) or forward (−) to take out the moment `qx`, m. Null for a weight of nothing. */
export const levellingShift = (qx: number, mass: number): number | null => (mass > 0 ? -qx / mass : null);
