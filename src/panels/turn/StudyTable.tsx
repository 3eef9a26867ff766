/** The stations that nothing beats. One that is picked can be moved to; one that is pointed at is marked in the drawing. */
import { useState } from 'react';
import { bestOfRuns } from '../../report/turning/placeRuns.ts';
import type { PlacedPoint } from '../../report/turning/studies.ts';
import { formatNumber } from '../../units/format.ts';
import { type Quantity, type UnitSystem, unitOf } from '../../units/units.ts';
import { useEditor } from '../editor.ts';
import { StudyActions } from './StudyActions.tsx';
import { useStudying } from './studying.ts';
import { useTurning } from './turning.ts';

interface Column {
  readonly head: string;
  readonly quantity: Quantity;
  value(point: PlacedPoint): number | null;
}

const COLUMNS: readonly Column[] = [
  {
    head: 'Lead, wire',
    quantity: 'mass',
    value: ({ ballast, wire }) => (ballast === null ? null : ballast + wire),
  },
  { head: '90° in', quantity: 'time', value: ({ timeTo90 }) => timeTo90 },
  { head: 'Radius', quantity: 'pathLength', value: ({ radius }) => radius },
  { head: 'Gust', quantity: 'speed', value: ({ gustHeld }) => gustHeld },
  { head: 'Per watt', quantity: 'ratio', value: ({ perWatt }) => perWatt },
  { head: 'Pitch', quantity: 'angle', value: ({ cruisePitch }) => cruisePitch },
];

/** The row of the place the thruster had when the study began. */
export const TODAY = 'today' as const;

/** A station, or the place of today. */
type Row = number | typeof TODAY;

interface StudyTableProps {
  readonly fresh: boolean;
  /** The row that the sentence above tells of, open until another is picked. */
  readonly told: Row | null;
  /** Whether the thruster has been moved since. */
  readonly moved: boolean;
}

export function StudyTable({ fresh, told, moved }: StudyTableProps) {
  const { points, today, complete } = useStudying();
  const [chosen, setPicked] = useState<Row | null | undefined>(undefined);
  if (!today) return null;
  const picked = chosen === undefined ? told : chosen;
  const best = bestOfRuns({ points, today }, typeof told === 'number' ? told : null);
  if (best.length === 0 && !today.best) return null;
  const row = (key: Row) => ({
    fresh,
    open: key === picked,
    onPick: () => setPicked(key === picked ? null : key),
  });
  const unheld = [today, ...best].some(({ cruisePitch }) => cruisePitch === null);
  return (
    <div className="plan-scroll">
      <table className="study-table">
        <caption>
          Nothing beats these{!complete && ' so far'}
          {!today.best && `, against ${moved ? 'before' : 'today'}`}
          {unheld && <small className="study-note">– under Pitch: {NO_PITCH}</small>}
        </caption>
        <Head />
        <tbody>
          <StudyRow point={today} name={moved ? 'before' : TODAY} {...row(TODAY)} />
          {best.map((point) => (
            <StudyRow key={point.station} point={point} name={null} {...row(point.station)} />
          ))}
        </tbody>
      </table>
    </div>
  );
}

const NO_PITCH = 'no attitude is held';

function Head() {
  const { units } = useEditor();
  return (
    <thead>
      <tr>
        <th scope="col">
          Station <small>{unitOf('length', units).symbol}</small>
        </th>
        {COLUMNS.map(({ head, quantity }) => (
          <th scope="col" key={head}>
            {head} <small>{unitOf(quantity, units).symbol}</small>
          </th>
        ))}
      </tr>
    </thead>
  );
}

interface StudyRowProps {
  readonly point: PlacedPoint;
  /** Instead of the station, where it is not one of those tried. */
  readonly name: string | null;
  readonly open: boolean;
  readonly fresh: boolean;
  onPick(): void;
}

function StudyRow({ point, name, open, fresh, onPick }: StudyRowProps) {
  const { units } = useEditor();
  const { set } = useTurning();
  const mark = () => set({ marked: point.station });
  const unmark = () => set({ marked: null });
  const at = bare(point.station, 'length', units);
  return (
    <>
      <tr data-station={name ?? point.station} onPointerEnter={mark} onPointerLeave={unmark}>
        <th scope="row">
          <button
            type="button"
            className="small"
            aria-expanded={open}
            onClick={onPick}
            onFocus={mark}
            onBlur={unmark}
          >
            {name ?? at}
          </button>
        </th>
        <Figures point={point} />
      </tr>
      {open && (
        <tr className="kept-actions" onPointerEnter={mark} onPointerLeave={unmark}>
          <td colSpan={COLUMNS.length + 1}>
            <StudyActions point={point} at={at} fresh={fresh} />
          </td>
        </tr>
      )}
    </>
  );
}

function Figures({ point }: { point: PlacedPoint }) {
  const { units } = useEditor();
  return COLUMNS.map(({ head, quantity, value }) => {
    const figure = value(point);
    return (
      <td
        className="number"
        key={head}
        title={figure === null && head === 'Pitch' ? `In cruise ${NO_PITCH}.` : undefined}
      >
        {figure === null ? '–' : bare(figure, quantity, units)}
      </td>
    );
  });
}

/** Without its unit, which stands in the head. */
const bare = (si: number, quantity: Quantity, units: UnitSystem): string => {
  const unit = unitOf(quantity, units);
  return formatNumber(unit.toDisplay(si), unit.digits);
};
