const rows = [0, 1, 2, 3, 4, 5, 6];

interface Wave { fromX: number; toX: number; y: number; height: number; step: number }

const wave = ({ fromX, toX, y, height, step }: Wave): string => {
  const bends = Array.from({ length: Math.floor((toX - fromX) / step) }, () => `t${String(step)} 0`);
  return `M${String(fromX)} ${String(y)}q${String(step / 2)} ${String(-height)} ${String(step)} 0${bends.slice(1).join('')}`;
};

/** Waves against a wall, and the calm behind it. */
export function LeeDrawing() {
  return (
    <svg viewBox="0 0 480 220" className="mt-8 h-auto w-full max-w-lg" fill="none" strokeLinecap="round" aria-hidden="true">
      <defs>
        <pattern id="wall" width="7" height="7" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
          <path d="M0 0v7" stroke="var(--ink)" strokeWidth="2.400" />
        </pattern>
      </defs>
      {rows.map((row) => <path key={row} d={wave({ fromX: 4, toX: 268, y: 30 + row * 27, height: 26 - row, step: 33 })} stroke="var(--copper)" strokeWidth="2" opacity={1 - row * 0.07} />)}
      <rect x="288" y="10" width="26" height="200" fill="url(#wall)" stroke="var(--ink)" strokeWidth="2" />
      {rows.map((row) => <path key={row} d={wave({ fromX: 334, toX: 474, y: 30 + row * 27, height: 5 - row * 0.6, step: 20 })} stroke="var(--patina)" strokeWidth="1.800" />)}
    </svg>
  );
}
