type Point = readonly [percent: number, tempC: number];

/** Points of the sodium chloride freezing curve, for a picture: ice down to the eutectic, then the dihydrate. */
const ice: readonly Point[] = [
  [0, 0],
  [2, -1.18],
  [4, -2.41],
  [6, -3.7],
  [8, -5.08],
  [10, -6.56],
  [12, -8.18],
  [14, -9.94],
  [16, -11.89],
  [18, -14.04],
  [20, -16.46],
  [22, -19.18],
  [23.3, -21.1],
];
const hydrate: readonly Point[] = [
  [23.3, -21.1],
  [23.8, -17.3],
  [24.4, -13],
  [25.1, -8],
  [25.8, -3],
  [26.3, 0.1],
];

const at = ([percent, tempC]: Point) => `${40 + percent * 18},${40 - tempC * 17}`;
const line = (points: readonly Point[]) => `M${points.map(at).join('L')}`;

/** The curve that everything here turns on, drawn large and quiet: for the page one signs in on. */
export function BrineFigure({ className }: Readonly<{ className?: string }>) {
  return (
    <svg aria-hidden viewBox="0 0 560 460" fill="none" className={className}>
      {[0, -5, -10, -15, -20].map((tempC) => (
        <g key={tempC}>
          <path d={`M40 ${40 - tempC * 17}H530`} className="stroke-line" />
          <text x="30" y={44 - tempC * 17} textAnchor="end" className="fill-faint font-mono text-xs">
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
      <text x="64" y="340" className="fill-frozen text-sm">
        ice and brine
      </text>
      <text x="330" y="84" className="fill-soft text-sm">
        all brine
      </text>
      <text x="196" y="170" textAnchor="end" className="fill-urgent text-sm">
        refreezes here
      </text>
      <circle cx={40 + 9.3 * 18} cy="142" r="7" className="fill-urgent" />
    </svg>
  );
}
