/** What can be carried where: a curve over the drawing along a line, and what each load of the list costs or saves. */
import { listed } from '../../craft/craft.ts';
import type { CarryLine } from '../../report/plans.ts';
import { useEditor } from '../editor.ts';
import { ChoiceField } from '../fields/ChoiceField.tsx';
import { CarryTableView } from './CarryTableView.tsx';
import { usePlanning } from './planning.ts';

const NONE = 'none';
const HARDPOINT = 'hardpoint ';

export function CarrySection() {
  const { craft } = useEditor();
  const { carry, setLine } = usePlanning();
  const choices = [
    { value: NONE, label: 'No curve' },
    { value: 'keel', label: 'Along the keel' },
    { value: 'axis', label: 'Along the axis' },
    ...listed(craft.hardpoints).map(({ id, name }) => ({
      value: `${HARDPOINT}${id}`,
      label: `On the line of ${name || 'a hardpoint'}`,
    })),
  ];
  return (
    <>
      <ChoiceField
        label="Curve"
        value={keyOf(carry.line)}
        choices={choices}
        hint="Drawn over the side view: the most that can hang at each station, all else planned anew"
        onCommit={(key) => {
          setLine(lineOf(key));
          return null;
        }}
      />
      {carry.line && <CurveState />}
      <CarryTableView />
    </>
  );
}

const keyOf = (line: CarryLine | null): string =>
  line ? (line.kind === 'hardpoint' ? `${HARDPOINT}${line.hardpoint}` : line.kind) : NONE;

function lineOf(key: string): CarryLine | null {
  if (key === NONE) return null;
  return key === 'keel' || key === 'axis'
    ? { kind: key }
    : { kind: 'hardpoint', hardpoint: key.slice(HARDPOINT.length) };
}

function CurveState() {
  const { craft } = useEditor();
  const { carry, stopCarry, setCarryLoad } = usePlanning();
  const loads = listed(craft.loads).map(({ id, name }) => ({
    value: id,
    label: name || 'Load without a name',
  }));
  const chosen = loads.find(({ value }) => value === carry.load) ?? loads[0];
  return (
    <>
      {carry.busy && (
        <div className="plan-status" role="status">
          <progress aria-label="Working out the curve" value={carry.share} />
          <button type="button" onClick={stopCarry}>
            Stop
          </button>
        </div>
      )}
      {carry.why && <p className="field-error">{carry.why}</p>}
      {carry.curve && !carry.curve.complete && (
        <p className="aside">It ends where it was stopped or time ran out.</p>
      )}
      {chosen ? (
        <ChoiceField
          label="A click hangs"
          value={chosen.value}
          choices={loads}
          onCommit={(id) => {
            setCarryLoad(id);
            return null;
          }}
        />
      ) : (
        <p className="aside">
          Put a load on the list under Useful loads, and a click on the curve hangs it there.
        </p>
      )}
    </>
  );
}
