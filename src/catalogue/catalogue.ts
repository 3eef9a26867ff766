/** The starter catalogue that comes with the program, from `seeds/`. */
import conductors from '../../seeds/conductors.json' with { type: 'json' };
import films from '../../seeds/films.json' with { type: 'json' };
import gases from '../../seeds/gases.json' with { type: 'json' };
import parts from '../../seeds/parts.json' with { type: 'json' };
import { problemText } from '../craft/problem.ts';
import { type Catalogue, catalogueOf } from './catalogueOf.ts';

const outcome = catalogueOf({ films, gases, conductors, parts });
// The seed files ship with the program and are tested, so this is a fault of the build, not of anybody's input.
if (!outcome.ok) throw new Error(`seeds/: ${outcome.problems.map(problemText).join('\n')}`);

export const catalogue: Catalogue = outcome.catalogue;
