/** Points of the sodium chloride freezing curve: mass per cent, °C. Ice to the eutectic, then the dihydrate. */
const ice: readonly (readonly [number, number])[] = [
  [0, 0],
  [5, -3.05],
  [10, -6.56],
  [15, -10.89],
  [20, -16.46],
  [23.3, -21.1],
];
const hydrate: readonly (readonly [number, number])[] = [
  [23.3, -21.1],
  [24, -17],
  [25, -10],
  [26.3, 0.1],
];

const at = ([percent, tempC]: readonly [number, number]) => `${40 + percent * 18},${40 - tempC * 17}`;
const line = (points: readonly (readonly [number, number])[]) => `M${points.map(at).join('L')}`;

/** The curve that everything here turns on, drawn large and quiet: for the page one signs in on. */
export function BrineFigure({ className }: Readonly<{ className?: string }>) {
  return (
    <svg aria-hidden viewBox="0 0 560 460" fill="none" className={className}>
      {[0, -5, -10, -15, -20].map((tempC) => (
        <g key={tempC}>
          <path d={`M40 ${40 - tempC * 17}H530`} className="stroke-line" />
          <text x="30" y={44 - tempC * 17} textAnchor="end" className="fill-faint font-mono text-sm">
            {tempC === 0 ? '0' : `−${-tempC}`}
          </text>
        </g>
      ))}
      <path d={`${line(ice)}L40 ${40 + 21.1 * 17}Z`} className="fill-frozen opacity-[0.07]" />
      <path d="M40 142H530" className="stroke-closing" strokeDasharray="2 6" strokeWidth="1.5" />
      <path d={line(ice)} className="stroke-lamp" strokeWidth="3" strokeLinejoin="round" />
      <path d={line(hydrate)} className="stroke-lamp opacity-50" strokeWidth="3" strokeLinejoin="round" />
      {[16.5, 14, 12, 10.4].map((percent) => (
        <circle key={percent} cx={40 + percent * 18} cy="142" r="4" className="fill-soft" />
      ))}
      <circle cx={40 + 9.3 * 18} cy="142" r="7" className="fill-urgent" />
    </svg>
  );
}
