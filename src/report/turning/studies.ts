/** What a placement study is, for the layers that show it and do not see the physics. */
export type { PlacedPoint } from '../../physics/placing/placedPoint.ts';
export type { PlacementStudy, StudyProgress } from '../../physics/placing/study.ts';
export type { TurnAsked } from '../../physics/turning/asked.ts';
