/** Of which craft the figures are; throttle, steering and the cruise that the turn begins from. */
import type { Craft } from '../../craft/craft.ts';
import { formatQuantity } from '../../units/format.ts';
import type { UnitSystem } from '../../units/units.ts';
import { useEditor } from '../editor.ts';
import { ChoiceField } from '../fields/ChoiceField.tsx';
import { FieldFrame } from '../fields/FieldFrame.tsx';
import { QuantityField } from '../fields/QuantityField.tsx';
import { steeringPart } from './asked.ts';
import { type Steering, type Subject, type Turning, useTurning } from './turning.ts';

/** `words`: what there is to say of the plan. */
export function SubjectChoice({ words }: { words: string }) {
  const { subject, set } = useTurning();
  return (
    <div className="turn-controls">
      <ChoiceField<Subject>
        label="Of the craft"
        value={subject}
        choices={SUBJECTS}
        onCommit={(next) => {
          set({ subject: next });
          return null;
        }}
      />
      <p className="aside" role="status">
        {words}
      </p>
    </div>
  );
}

const SUBJECTS = [
  { value: 'today', label: 'As it is' },
  { value: 'planned', label: 'With the ballast plan' },
] as const;

export function TurnControls() {
  const { craft, units } = useEditor();
  const turning = useTurning();
  return (
    <div className="turn-controls">
      <Throttle turning={turning} />
      <ChoiceField<Steering>
        label="Turn with"
        value={steeringPart(craft, turning) ? turning.steering : 'limit'}
        choices={steeringChoices(craft, turning, units)}
        onCommit={(steering) => {
          turning.set({ steering });
          return null;
        }}
      />
      <QuantityField
        label="From a cruise at"
        value={turning.speed}
        quantity="speed"
        units={units}
        empty="steady speed"
        onCommit={(speed) => {
          if (speed < 0 || speed > FASTEST)
            return { path: '', found: String(speed), allowed: `at most ${FASTEST}` };
          turning.set({ speed });
          return null;
        }}
        onClear={() => {
          turning.set({ speed: null });
          return null;
        }}
      />
    </div>
  );
}

/** m/s */
const FASTEST = 50;

function Throttle({ turning: { throttle, set } }: { turning: Turning }) {
  const { units } = useEditor();
  const put = (next: number) => {
    if (next < 0 || next > 1) return { path: '', found: String(next), allowed: '0 % to 100 %' };
    set({ throttle: next });
    return null;
  };
  return (
    <div className="throttle">
      <FieldFrame label="Throttle">
        {(aria) => (
          <input
            {...aria}
            type="range"
            min={0}
            max={1}
            step={0.01}
            value={throttle}
            aria-valuetext={formatQuantity(throttle, 'fraction', units)}
            onChange={(event) => put(event.currentTarget.valueAsNumber)}
          />
        )}
      </FieldFrame>
      <QuantityField
        bare
        label="Throttle as a number"
        value={throttle}
        quantity="fraction"
        units={units}
        onCommit={put}
      />
    </div>
  );
}

function steeringChoices(craft: Craft, turning: Turning, units: UnitSystem) {
  const part = steeringPart(craft, turning);
  const hardest = { value: 'limit', label: 'Hardest to starboard' } as const;
  if (!part?.thruster) return [hardest];
  return [hardest, { value: 'set', label: `Arrow: ${angleWords(part.thruster.yaw.set, units)}` } as const];
}

/** So that whole degrees are shown, rad: the list is narrow. */
const COARSE = 0.2;

function angleWords(angle: number, units: UnitSystem): string {
  const side = angle > 0 ? ' starboard' : angle < 0 ? ' port' : '';
  return `${formatQuantity(Math.abs(angle), 'angle', units, { uncertainty: COARSE })}${side}`;
}
