/** The kept plan that is shown, beside today or beside another of those kept. */
import { useMemo } from 'react';
import type { Craft } from '../../craft/craft.ts';
import { stowed } from '../../craft/stowage.ts';
import { useEditor } from '../editor.ts';
import { ChoiceField } from '../fields/ChoiceField.tsx';
import { Compared, type Side } from './Compared.tsx';
import { type KeptPlan, usePlanning } from './planning.ts';

const TODAY = 'today';

export function KeptBeside({ shown }: { shown: KeptPlan }) {
  const { craft } = useEditor();
  const { kept, beside, showBeside } = usePlanning();
  const one = useMemo(() => sideOf(craft, beside), [craft, beside]);
  const other = useMemo(() => sideOf(craft, shown), [craft, shown]);
  const others = kept.filter((each) => each !== shown);
  return (
    <>
      {others.length > 0 && (
        <ChoiceField
          label={`Plan ${shown.number} beside`}
          value={beside ? String(beside.number) : TODAY}
          choices={[
            { value: TODAY, label: 'Today' },
            ...others.map(({ number }) => ({ value: String(number), label: `Plan ${number}` })),
          ]}
          onCommit={(value) => {
            showBeside(others.find(({ number }) => String(number) === value) ?? null);
            return null;
          }}
        />
      )}
      <Compared
        title={
          beside ? `Plan ${beside.number} and plan ${shown.number}` : `Today and with plan ${shown.number}`
        }
        sides={[one, other]}
        places
      />
    </>
  );
}

const sideOf = (craft: Craft, kept: KeptPlan | null): Side =>
  kept ? { head: `Plan ${kept.number}`, craft: stowed(craft, kept.stowage) } : { head: 'Today', craft };
