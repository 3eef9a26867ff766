/** What a turn is, for the layers that show it and do not see the physics. */

export type { ClimbPoint } from '../../physics/cruise/climb.ts';
export type { Comparison } from '../../physics/thrust/compare.ts';
export type { SpeedPoint } from '../../physics/thrust/speed.ts';
export type {
  Authority,
  Glide,
  QuarterTurn,
  SteadyPoint,
  SteadyTurn,
  Track,
  Turn,
  TurnAsked,
  YawStop,
} from '../../physics/turning/turn.ts';
