/** The turn panel with the path player in it; loaded with the tab, so that the opening page stays light. */
import { TurnPanel } from '../panels/turn/TurnPanel.tsx';

export function TurnTab() {
  return <TurnPanel player={null} />;
}
