/** The air of the day, given in one of three ways. */
import type { Day } from '../craft/schema.ts';
import { setDay } from '../edit/edits/craft.ts';
import { useCommit } from './commit.ts';
import { dayAs } from './dayAs.ts';
import { useEditor } from './editor.ts';
import { ChoiceField } from './fields/ChoiceField.tsx';
import { QuantityField } from './fields/QuantityField.tsx';
import { RowList } from './RowList.tsx';

const DAY_CHOICES = [
  { value: 'measured', label: 'Measured on the spot' },
  { value: 'qnh', label: 'QNH and elevation' },
  { value: 'standard', label: 'Standard atmosphere' },
] as const;

export function DayPanel() {
  const { craft, assessment, units } = useEditor();
  const commit = useCommit();
  const pressure = assessment.rows['air.pressure']?.value ?? null;
  return (
    <section className="panel" aria-label="Day">
      <ChoiceField
        label="Air given by"
        value={craft.day.kind}
        choices={DAY_CHOICES}
        onCommit={(kind) => commit(setDay('day', dayAs(kind, craft.day, pressure)))}
      />
      <DayFields day={craft.day} />
      <RowList rows={[assessment.rows['air.pressure'], assessment.rows['air.density']]} units={units} />
    </section>
  );
}

function DayFields({ day }: { day: Day }) {
  switch (day.kind) {
    case 'measured':
      return (
        <>
          <DayField day={day} field="temperature" label="Temperature" quantity="temperature" />
          <DayField day={day} field="pressure" label="Air pressure on site" quantity="pressure" />
          <DayField day={day} field="humidity" label="Humidity" quantity="fraction" />
        </>
      );
    case 'qnh':
      return (
        <>
          <DayField day={day} field="temperature" label="Temperature" quantity="temperature" />
          <DayField day={day} field="qnh" label="QNH" quantity="pressure" />
          <DayField day={day} field="elevation" label="Elevation" quantity="elevation" />
          <DayField day={day} field="humidity" label="Humidity" quantity="fraction" />
        </>
      );
    case 'standard':
      return <DayField day={day} field="elevation" label="Elevation" quantity="elevation" />;
  }
}

interface DayFieldProps<D extends Day> {
  readonly day: D;
  readonly field: Exclude<keyof D, 'kind'> & string;
  readonly label: string;
  readonly quantity: 'temperature' | 'pressure' | 'fraction' | 'elevation';
}

function DayField<D extends Day>({ day, field, label, quantity }: DayFieldProps<D>) {
  const { units } = useEditor();
  const commit = useCommit();
  return (
    <QuantityField
      label={label}
      value={day[field] as number}
      quantity={quantity}
      units={units}
      onCommit={(next, run) => commit(setDay(label.toLowerCase(), { ...day, [field]: next }), run)}
    />
  );
}
