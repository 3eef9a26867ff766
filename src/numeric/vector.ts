/** Three components: along x (aft), y (starboard), z (up) wherever the craft is meant. */
export type Vec3 = readonly [x: number, y: number, z: number];
