/** One or two curves over one axis, small, each told by its name and its dash as well as by its colour. */

export interface PlotCurve {
  readonly name: string;
  /** Each a line of its own: the curve is broken between them. */
  readonly pieces: readonly (readonly PlotPoint[])[];
}

export interface PlotPoint {
  readonly x: number;
  readonly y: number;
}

export interface PlotAxis {
  readonly least: number;
  readonly most: number;
  /** Both ends with their unit. */
  readonly leastWords: string;
  readonly mostWords: string;
}

interface SmallPlotProps {
  readonly title: string;
  /** The plot in a sentence. */
  readonly words: string;
  readonly curves: readonly PlotCurve[];
  readonly x: PlotAxis & { readonly name: string };
  readonly y: PlotAxis;
}

export function SmallPlot({ title, words, curves, x, y }: SmallPlotProps) {
  const nought = y.least < 0 && y.most > 0 ? 1 - shareOf(0, y) : null;
  return (
    <figure className="small-plot">
      <figcaption>
        {title}
        {curves.length > 1 &&
          curves.map(({ name }, i) => (
            <span key={name} className="small-plot-name">
              <svg viewBox="0 0 18 4" aria-hidden="true">
                <line className={`curve-${i}`} x1={0} x2={18} y1={2} y2={2} />
              </svg>
              {name}
            </span>
          ))}
      </figcaption>
      <span className="small-plot-y number" aria-hidden="true">
        <span>{y.mostWords}</span>
        <span>{y.leastWords}</span>
      </span>
      <svg
        className="small-plot-area"
        viewBox="0 0 1 1"
        preserveAspectRatio="none"
        role="img"
        aria-label={words}
      >
        {nought !== null && <line className="nought" x1={0} x2={1} y1={nought} y2={nought} />}
        {curves.flatMap(({ name, pieces }, i) =>
          pieces.map((points) => (
            <polyline
              key={`${name} from ${points[0]?.x}`}
              className={`curve-${i}`}
              points={points.map((at) => `${shareOf(at.x, x)},${1 - shareOf(at.y, y)}`).join(' ')}
            />
          )),
        )}
      </svg>
      <span className="small-plot-x" aria-hidden="true">
        <span>{x.leastWords}</span>
        <span>{x.name}</span>
        <span>{x.mostWords}</span>
      </span>
    </figure>
  );
}

/** Where on its axis, 0 … 1. */
const shareOf = (value: number, { least, most }: PlotAxis): number => (value - least) / (most - least);
