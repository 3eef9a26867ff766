/** The lifting gas, and what to mind about it. */
import { catalogue } from '../catalogue/catalogue.ts';
import type { Gas } from '../craft/schema.ts';
import { setGas } from '../edit/edits/craft.ts';
import { HAZARDS } from '../report/hazards.ts';
import { Caution } from './Caution.tsx';
import { useCommit } from './commit.ts';
import { useEditor } from './editor.ts';
import { ChoiceField } from './fields/ChoiceField.tsx';
import { QuantityField } from './fields/QuantityField.tsx';
import { RowList } from './RowList.tsx';

const GAS_CHOICES = catalogue.gases.map(({ id, name }) => ({ value: id, label: name }));
const LIFTING_CHOICES = [
  { value: 'helium', label: 'Helium' },
  { value: 'hydrogen', label: 'Hydrogen' },
] as const;

export function GasPanel() {
  const { craft, assessment, units } = useEditor();
  const commit = useCommit();
  const { lifting, purity, superheat, gaugePressure } = craft.gas;
  const set = (field: string, change: Partial<Gas>, run?: string) => commit(setGas(field, change), run);
  const known = catalogue.gases.find((gas) => gas.lifting === lifting && gas.purity === purity);
  const choose = (id: string) => {
    const gas = catalogue.gases.find((each) => each.id === id)!;
    return set('gas', { lifting: gas.lifting, purity: gas.purity });
  };
  const rows = ['gas.density', 'gas.mass', 'lift.gross'].map((key) => assessment.rows[key]);
  return (
    <section className="panel" aria-label="Gas">
      <ChoiceField
        label="From the catalogue"
        value={known?.id ?? null}
        choices={GAS_CHOICES}
        none="Own gas"
        onCommit={choose}
      />
      {known && (
        <p className="aside">
          <cite>{known.source}</cite>
        </p>
      )}
      <ChoiceField
        label="Lifting gas"
        value={lifting}
        choices={LIFTING_CHOICES}
        onCommit={(next) => set('lifting gas', { lifting: next })}
      />
      <Caution>{HAZARDS[lifting]}</Caution>
      <QuantityField
        label="Purity"
        value={purity}
        quantity="fraction"
        units={units}
        hint="Share by volume; the rest is taken as air."
        onCommit={(next, run) => set('purity', { purity: next }, run)}
      />
      <QuantityField
        label="Superheat"
        value={superheat}
        quantity="temperatureDifference"
        units={units}
        hint="How much warmer the gas is than the air."
        onCommit={(next, run) => set('superheat', { superheat: next }, run)}
      />
      <QuantityField
        label="Gauge pressure"
        value={gaugePressure}
        quantity="gaugePressure"
        units={units}
        hint="Gas pressure above the air outside."
        onCommit={(next, run) => set('gauge pressure', { gaugePressure: next }, run)}
      />
      <Caution>{HAZARDS.pressure}</Caution>
      <RowList rows={rows} units={units} />
    </section>
  );
}
