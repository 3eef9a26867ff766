/** What planning adds to the side view, on a layer of its own: rails, gauges, and the plan as ghosts. */
import { useMemo } from 'react';
import { Layer } from 'react-konva/es/ReactKonvaCore.js';
import { idsOf, type Selection } from '../edit/selection.ts';
import { gaugesOf, ghostMarks, plannedBob, weightMarks } from '../scene/planMarks.ts';
import type { Planned } from '../scene/planned.ts';
import type { Overlay } from './overlay.ts';
import { GaugeMarks, PlanMarks } from './PlanMarks.tsx';
import { planTaken, planTexts } from './planTexts.ts';
import { RailMarks } from './RailMarks.tsx';
import { layTexts, TextMarks } from './TextMarks.tsx';
import type { Rails } from './useRails.ts';
import { useSame } from './useSame.ts';
import type { SideScene } from './useSideScene.ts';

/** Small things are compared by what they say, so that the layer is drawn again only when one changes. */
const sameText = (a: unknown, b: unknown): boolean => JSON.stringify(a) === JSON.stringify(b);

export interface PlanLayerProps {
  readonly scene: SideScene;
  readonly selection: Selection;
  readonly hover: Overlay['hover'];
  readonly rails: Rails;
  readonly planned: Planned | null;
  /** Names of the parts. */
  readonly labels: Parameters<typeof planTaken>[3];
}

export function PlanLayer({ scene, selection, hover, rails, planned, labels }: PlanLayerProps) {
  const { craft, view, palette, units, geometry, hardpoints } = scene;
  const { parts, loads, hardpoints: byId } = craft;
  // biome-ignore lint/correctness/useExhaustiveDependencies: of the craft only what hangs where matters
  const found = useMemo(
    () => gaugesOf(craft, planned, hardpoints, view, units),
    [parts, loads, byId, geometry.hull, planned, view, units],
  );
  const gauges = useSame(found, sameText);
  const plan = useMemo(
    () =>
      planned && {
        ghosts: ghostMarks(planned, geometry, 1 / view.scale, units),
        ashore: planned.ashore,
        weights: weightMarks(planned, view, units),
        bob: plannedBob(planned, geometry, view),
      },
    [planned, geometry, view, units],
  );
  const chosen = idsOf(selection, 'hardpoint');
  const told = useSame([...chosen, ...(hover?.kind === 'hardpoint' ? [hover.id] : [])]);
  const { rails: lines, open, knobs, lit } = rails;
  const frame = { left: 4, top: 4, right: view.width - 4, bottom: view.height - 28 };
  const taken = planTaken(scene, plan, knobs, labels);
  const texts = useSame(layTexts(planTexts(scene, plan, lines), taken, frame), sameText);
  return (
    <Layer listening={false}>
      {lines.length > 0 && <RailMarks rails={lines} {...{ open, knobs, lit, view, palette, units }} />}
      {plan && <PlanMarks {...plan} view={view} palette={palette} />}
      <GaugeMarks gauges={gauges} told={told} palette={palette} />
      <TextMarks texts={texts} />
    </Layer>
  );
}
