/** How the craft turns, climbs and flies with its thrusters as they are, and where a thruster had better sit. */
import type { ReactNode } from 'react';
import './turn.css';

interface TurnPanelProps {
  /** Plays the path of the turn; the page puts it in, since panels do not draw. */
  readonly player: ReactNode;
}

export function TurnPanel({ player }: TurnPanelProps) {
  return (
    <section className="panel turn" aria-label="Turning">
      {player}
    </section>
  );
}
