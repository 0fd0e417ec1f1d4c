import type { AxisKind } from '../../components/plot/frequency-ticks';
import { Button } from '../../components/Button';

interface PlotToolsProps { axisKind: AxisKind; zoomed: boolean; onAxisKind: (kind: AxisKind) => void; onZoom: (factor: number) => void; onReset: () => void; onLowest: () => void }

/** Everything that a drag or a key does, for a click. */
export function PlotTools({ axisKind, zoomed, onAxisKind, onZoom, onReset, onLowest }: PlotToolsProps) {
  return (
    <div className="not-printed -ms-1.5 flex flex-wrap items-center gap-x-3 gap-y-1">
      <Button kind="quiet" onClick={onLowest}>Lowest</Button>
      <Button kind="quiet" onClick={() => onZoom(0.5)}>Closer</Button>
      <Button kind="quiet" onClick={() => onZoom(2)} disabled={!zoomed}>Farther</Button>
      <Button kind="quiet" onClick={onReset} disabled={!zoomed}>Whole</Button>
      <Button kind="quiet" aria-pressed={axisKind === 'linear'} onClick={() => onAxisKind(axisKind === 'linear' ? 'log' : 'linear')}>
        {axisKind === 'linear' ? 'Axis: linear' : 'Axis: logarithmic'}
      </Button>
    </div>
  );
}
