/** How hard a thruster pushes at rest: measured, or from shaft power. */
import { thrustAs } from '../../report/thrusterAs.ts';
import { ChoiceField } from '../fields/ChoiceField.tsx';
import { choicesOf } from '../words.ts';
import { FigureField, type SetFigures } from './FigureField.tsx';
import type { FieldsOfThruster } from './ThrustFields.tsx';

const CHOICES = choicesOf(['measured', 'power'], {
  measured: 'Measured',
  power: 'From shaft power',
});

/** `density` of the air, kg/m³; null while there is none. */
export function StaticThrustFields({ data, density, set }: FieldsOfThruster & { density: number | null }) {
  const { thrust } = data;
  const choose = (kind: typeof thrust.kind) =>
    density === null
      ? { path: '', found: kind, allowed: 'a change once the hull can be formed' }
      : set('source of the thrust', { thrust: thrustAs(kind, data, density) });
  const setThrust: SetFigures<typeof thrust> = (field, change, run) =>
    set(field, { thrust: { ...thrust, ...change } as typeof thrust }, run);
  return (
    <>
      <ChoiceField label="Thrust is" value={thrust.kind} choices={CHOICES} onCommit={choose} />
      {thrust.kind === 'measured' ? (
        <FigureField
          label="Thrust at rest"
          figures={thrust}
          name="staticThrust"
          quantity="force"
          hint="At the bench: of one piece, at full throttle"
          set={setThrust}
        />
      ) : (
        <>
          <FigureField
            label="Shaft power"
            figures={thrust}
            name="shaftPower"
            quantity="power"
            hint="Of one piece at full throttle, at the propeller: less than the battery gives"
            set={setThrust}
          />
          <FigureField
            label="Figure of merit"
            figures={thrust}
            name="figureOfMerit"
            quantity="ratio"
            hint="Ideal power over shaft power at rest"
            set={setThrust}
          />
        </>
      )}
    </>
  );
}
