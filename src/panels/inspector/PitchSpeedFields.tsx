/** How fast a propeller moves on: its pitch speed given, or from how fast it turns. */
import { pitchSpeedAs } from '../../report/thrusterAs.ts';
import { ChoiceField } from '../fields/ChoiceField.tsx';
import { choicesOf } from '../words.ts';
import { FigureField, type SetFigures } from './FigureField.tsx';
import type { FieldsOfThruster } from './ThrustFields.tsx';

const CHOICES = choicesOf(['given', 'turning'], {
  given: 'Given',
  turning: 'From motor speed',
});

const TURNING = [
  { name: 'motorSpeed', label: 'Motor speed', quantity: 'turnSpeed', hint: 'At full throttle' },
  { name: 'gearRatio', label: 'Gear ratio', quantity: 'ratio', hint: 'Motor turns for one of the propeller' },
  { name: 'pitch', label: 'Propeller pitch', quantity: 'smallLength', hint: 'Advance in one turn' },
] as const;

export function PitchSpeedFields({ data, set }: FieldsOfThruster) {
  const { pitchSpeed } = data;
  const setSpeed: SetFigures<typeof pitchSpeed> = (field, change, run) =>
    set(field, { pitchSpeed: { ...pitchSpeed, ...change } as typeof pitchSpeed }, run);
  return (
    <>
      <ChoiceField
        label="Pitch speed is"
        value={pitchSpeed.kind}
        choices={CHOICES}
        onCommit={(kind) => set('source of the pitch speed', { pitchSpeed: pitchSpeedAs(kind, data) })}
      />
      {pitchSpeed.kind === 'given' ? (
        <FigureField
          label="Pitch speed"
          figures={pitchSpeed}
          name="speed"
          quantity="speed"
          hint="Speed at which its thrust is nil"
          set={setSpeed}
        />
      ) : (
        TURNING.map((field) => (
          <FigureField key={field.name} {...field} figures={pitchSpeed} set={setSpeed} />
        ))
      )}
    </>
  );
}
