/** The plate beside the sign-in form: a hat section drawn with its dimensions, and its blank below it. */
export function FoldPlate() {
  const thin = { stroke: "var(--steel-500)", strokeWidth: 0.8, fill: "none" } as const;
  return (
    <div aria-hidden className="hidden flex-col justify-between bg-sheet p-10 lg:flex">
      <div className="flex grow items-center border border-steel-500 p-6">
        <svg viewBox="0 0 640 420" className="h-auto w-full" fontSize="12">
          <g stroke="var(--ink)" fill="none">
            <path d="M70 180h78a22 22 0 0 0 22-22V92a12 12 0 0 1 12-12h276a12 12 0 0 1 12 12v66a22 22 0 0 0 22 22h78" strokeWidth="10" />
            <path d="M70 180h78a22 22 0 0 0 22-22V92a12 12 0 0 1 12-12h276a12 12 0 0 1 12 12v66a22 22 0 0 0 22 22h78" strokeWidth="7.4" stroke="var(--steel-200)" />
          </g>
          <g {...thin}>
            <path d="M165 62V34M475 62V34M165 40h310" /><path d="M165 40l9 2.2v-4.4zM475 40l-9 2.2v-4.4z" fill="var(--steel-500)" stroke="none" />
            <path d="M604 185h22M484 75h142M618 75v110" /><path d="M618 75l2.2 9h-4.4zM618 185l2.2-9h-4.4z" fill="var(--steel-500)" stroke="none" />
            <path d="M320 58v46" strokeDasharray="12 3 2 3" />
          </g>
          <g stroke="var(--ink)" fill="var(--paper)" strokeWidth="1.2"><path d="M40 262h560v96H40z" /><path d="M70 174.9v10.2M570 174.9v10.2" /></g>
          <g stroke="var(--accent)" strokeWidth="1.2" fill="none">
            <path d="M124 262v96M516 262v96" strokeDasharray="14 4 3 4" /><path d="M234 262v96M406 262v96" strokeDasharray="6 5" />
          </g>
          <g {...thin}><path d="M40 366v30M600 366v30M40 390h560" /><path d="M40 390l9 2.2v-4.4zM600 390l-9 2.2v-4.4z" fill="var(--steel-500)" stroke="none" /></g>
          <g className="num" fill="var(--ink-soft)" textAnchor="middle" style={{ fontSize: 13 }}>
            <text x="320" y="33">60</text><text x="604" y="134" transform="rotate(-90 606 130)">40</text><text x="320" y="383">166.1</text>
          </g>
          <g className="num" fill="var(--accent-ink)" textAnchor="middle" style={{ fontSize: 12 }}>
            <text x="124" y="254">U 90°</text><text x="234" y="254">D 90°</text><text x="406" y="254">D 90°</text><text x="516" y="254">U 90°</text>
          </g>
        </svg>
      </div>
      <div className="flex border border-t-0 border-steel-500">
        <p className="grow px-4 py-3 text-lg">From the flanges of a part to good parts off the brake.</p>
        <p className="border-l border-steel-500 px-4 py-3"><span className="caption block">Advice only</span>The makers’ ratings, local rules and trained people decide.</p>
      </div>
    </div>
  );
}
