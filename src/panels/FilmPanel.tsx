/** The film the hull is made of. */
import { catalogue } from '../catalogue/catalogue.ts';
import { setFilm } from '../edit/edits/craft.ts';
import { useCommit } from './commit.ts';
import { useEditor } from './editor.ts';
import { ChoiceField } from './fields/ChoiceField.tsx';
import { QuantityField } from './fields/QuantityField.tsx';
import { TextField } from './fields/TextField.tsx';
import { RowList } from './RowList.tsx';

const FILM_CHOICES = catalogue.films.map(({ id, name }) => ({ value: id, label: name }));

export function FilmPanel() {
  const { craft, assessment, units } = useEditor();
  const commit = useCommit();
  const { name, arealDensity, arealDensityTolerance } = craft.film;
  const known = catalogue.films.find((film) => film.name === name && film.arealDensity === arealDensity);
  const choose = (id: string) => {
    const film = catalogue.films.find((each) => each.id === id)!;
    return commit(
      setFilm('film', {
        name: film.name,
        arealDensity: film.arealDensity,
        arealDensityTolerance: film.arealDensityTolerance,
      }),
    );
  };
  return (
    <section className="panel" aria-label="Film">
      <ChoiceField
        label="From the catalogue"
        value={known?.id ?? null}
        choices={FILM_CHOICES}
        none="Own film"
        onCommit={choose}
      />
      {known && (
        <p className="aside">
          {known.note} <cite>{known.source}</cite>
        </p>
      )}
      <TextField
        label="Film"
        value={name}
        onCommit={(next) => commit(setFilm('film name', { name: next }))}
      />
      <QuantityField
        label="Areal density"
        value={arealDensity}
        quantity="arealDensity"
        units={units}
        hint="Weigh a cut square, or take the maker’s sheet."
        onCommit={(next, run) => commit(setFilm('areal density', { arealDensity: next }), run)}
      />
      <QuantityField
        label="± areal density"
        value={arealDensityTolerance}
        quantity="arealDensity"
        units={units}
        onCommit={(next, run) =>
          commit(setFilm('areal density tolerance', { arealDensityTolerance: next }), run)
        }
      />
      <RowList rows={[assessment.rows['hull.filmArea'], assessment.rows['hull.filmMass']]} units={units} />
    </section>
  );
}
