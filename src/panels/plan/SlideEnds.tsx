/** The two ends of a slide, foremost and aftmost station. */
import type { Slide } from '../../craft/planningSchema.ts';
import type { Problem } from '../../craft/problem.ts';
import { useEditor } from '../editor.ts';
import { QuantityField } from '../fields/QuantityField.tsx';

interface SlideEndsProps {
  readonly prefix: string;
  readonly slide: Slide;
  /** Hands in both ends, in order. */
  onSlide(slide: Slide, run?: string): Problem | null;
}

export function SlideEnds({ prefix, slide: { from, to }, onSlide }: SlideEndsProps) {
  const { units } = useEditor();
  const problem = (found: number, allowed: string): Problem => ({ path: '', found: String(found), allowed });
  return (
    <>
      <QuantityField
        label={`${prefix} from`}
        value={from}
        quantity="length"
        units={units}
        hint="Foremost station"
        onCommit={(next, run) =>
          next > to ? problem(next, `at most ${to}`) : onSlide({ from: next, to }, run)
        }
      />
      <QuantityField
        label={`${prefix} to`}
        value={to}
        quantity="length"
        units={units}
        hint="Aftmost station"
        onCommit={(next, run) =>
          next < from ? problem(next, `at least ${from}`) : onSlide({ from, to: next }, run)
        }
      />
    </>
  );
}
