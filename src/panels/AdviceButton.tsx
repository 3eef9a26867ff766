/** A button that carries out one piece of advice; none where there is no such advice. */
import { stationOf } from '../craft/station.ts';
import type { Advice } from '../report/advice.ts';
import { formatQuantity } from '../units/format.ts';
import type { UnitSystem } from '../units/units.ts';
import { type AdviceKind, adviceEdit, adviceOf } from './advice.ts';
import { useEditor } from './editor.ts';
import { useAdding } from './ledger/adding.ts';

const WORDS: Readonly<Record<AdviceKind, string>> = {
  lead: 'Hang this lead',
  slide: 'Slide it there',
  load: 'Add a load there',
};

export function AdviceButton({ kind }: { kind: AdviceKind }) {
  const { assessment, units, dragging, apply } = useEditor();
  const add = useAdding('part');
  const advice = adviceOf(assessment, kind);
  if (!advice) return null;
  const carryOut = () => (advice.kind === 'slide' ? apply : add)(adviceEdit(advice));
  return (
    <button
      type="button"
      className="small"
      disabled={dragging}
      title={detail(advice, units)}
      onClick={carryOut}
    >
      {WORDS[kind]}
    </button>
  );
}

function detail(advice: Advice, units: UnitSystem): string {
  const at = formatQuantity(stationOf(advice.place), 'length', units);
  if (advice.kind === 'slide') return `${advice.name} to ${at}`;
  const mass = formatQuantity(advice.mass, 'mass', units);
  return advice.kind === 'lead' ? `${mass} of ballast at ${advice.name}` : `${mass} below the keel at ${at}`;
}
