/** In place of a drawing while there is no hull to draw. */
import type { Palette } from '../scene/palette.ts';
import { FONT } from './paint.ts';

export function Unformed({ why, palette, testId }: { why: string; palette: Palette; testId: string }) {
  return (
    <div
      data-testid={testId}
      style={{
        width: '100%',
        height: '100%',
        display: 'grid',
        placeItems: 'center',
        background: palette.paper,
      }}
    >
      <p style={{ maxWidth: 460, padding: 16, color: palette.ink, font: `14px/1.5 ${FONT}` }}>{why}</p>
    </div>
  );
}
