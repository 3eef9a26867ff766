/** A few curves over one axis, small, each told by its name and its dash as well as by its colour. */

export interface PlotCurve {
  readonly name: string;
  readonly points: readonly { readonly x: number; readonly y: number }[];
}

export interface PlotAxis {
  /** What it is, with the unit of its ends. */
  readonly name: string;
  readonly most: number;
  readonly mostWords: string;
}

interface SmallPlotProps {
  readonly title: string;
  /** The plot in a sentence. */
  readonly words: string;
  /** Two at most. */
  readonly curves: readonly PlotCurve[];
  readonly x: PlotAxis;
  readonly y: PlotAxis;
}

export function SmallPlot({ title, words, curves, x, y }: SmallPlotProps) {
  const place = (of: PlotCurve) => of.points.map((at) => `${at.x / x.most},${1 - at.y / y.most}`).join(' ');
  return (
    <figure className="small-plot">
      <figcaption>
        {title}
        {curves.map(({ name }, i) => (
          <span key={name} className="small-plot-name">
            <svg viewBox="0 0 18 4" aria-hidden="true">
              <line className={`curve-${i}`} x1={0} x2={18} y1={2} y2={2} />
            </svg>
            {name}
          </span>
        ))}
      </figcaption>
      <span className="small-plot-y">
        <span>{y.mostWords}</span>
        <span>0</span>
      </span>
      <svg
        className="small-plot-area"
        viewBox="0 0 1 1"
        preserveAspectRatio="none"
        role="img"
        aria-label={words}
      >
        {curves.map((curve, i) => (
          <polyline key={curve.name} className={`curve-${i}`} points={place(curve)} />
        ))}
      </svg>
      <span className="small-plot-x">
        <span>0</span>
        <span>{x.name}</span>
        <span>{x.mostWords}</span>
      </span>
    </figure>
  );
}
