import type { BedMap, BedPiece } from "@/lib/sheet/bedMap";
import { bedMapLayout, type BedMapLayout } from "@/lib/sheet/bedMapLayout";

interface BedMapDrawingProps {
  readonly map: BedMap;
  readonly className?: string;
  /** Pieces already standing on the bed are filled. */
  readonly placed?: ReadonlySet<string>;
  /** Shows this step's bend alone. */
  readonly step?: number;
  /** Only the run of the bed that carries tools. */
  readonly close?: boolean;
}

/** The bed as the operator sees it, to scale: punches above, dies below, bends between, centre line through. */
export function BedMapDrawing({ map, className, placed, step, close = false }: BedMapDrawingProps) {
  const layout = bedMapLayout(map, close);
  const { box, unit, rows } = layout;
  const bends = map.bends.filter((bend) => step === undefined || bend.step === step);
  return (
    <svg viewBox={box.join(" ")} role="img" aria-label={`Bed map, ${map.length} bed`} className={className}>
      <rect x={layout.bed[0]} y={rows.punch[0]} width={layout.bed[1] - layout.bed[0]} height={rows.die[1] - rows.punch[0]} fill="var(--steel-100)" stroke="var(--steel-400)" vectorEffect="non-scaling-stroke" />
      <line x1={0} x2={0} y1={rows.punch[0]} y2={rows.die[1]} stroke="var(--ink-soft)" strokeDasharray="10 3 2 3" vectorEffect="non-scaling-stroke" />
      {map.stations.map((station) => (
        <g key={station.id}>
          {station.pieces.map((piece) => <Piece key={`${piece.kind} ${piece.id} ${piece.from}`} piece={piece} layout={layout} done={placed?.has(piece.id) ?? false} />)}
          <text x={(station.from + station.to) / 2} y={rows.title} textAnchor="middle" fontSize={unit * 1.3} fontWeight={700} fill="var(--ink)">{station.id}</text>
          <text x={layout.names(station.id).x} y={rows.punchName} textAnchor={layout.names(station.id).anchor} fontSize={unit * 0.9} fill="var(--ink)">{station.punch}</text>
          <text x={layout.names(station.id).x} y={rows.dieName} textAnchor={layout.names(station.id).anchor} fontSize={unit * 0.9} fill="var(--ink)">{station.die}</text>
          <text x={station.from} y={rows.places} textAnchor="middle" fontSize={unit * 0.9} fill="var(--ink-soft)">{station.fromText}</text>
          <text x={station.to} y={rows.places + unit * 1.1} textAnchor="middle" fontSize={unit * 0.9} fill="var(--ink-soft)">{station.toText}</text>
        </g>
      ))}
      {bends.map((bend) => {
        const y = layout.bendLine(bend.step);
        return (
          <g key={bend.step}>
            <line x1={bend.from} x2={bend.to} y1={y} y2={y} stroke="var(--accent)" strokeWidth={2.5} vectorEffect="non-scaling-stroke" />
            <text x={bend.to + unit * 0.4} y={y + unit * 0.3} fontSize={unit * 0.85} fontWeight={700} fill="var(--accent-ink)">{bend.step}</text>
          </g>
        );
      })}
    </svg>
  );
}

function Piece({ piece, layout, done }: { readonly piece: BedPiece; readonly layout: BedMapLayout; readonly done: boolean }) {
  const [top, bottom] = piece.kind === "punch" ? layout.rows.punch : layout.rows.die;
  const lettering = layout.lettering(piece);
  const [x, y] = [(piece.from + piece.to) / 2, (top + bottom) / 2];
  const ink = done ? "var(--accent-on)" : "var(--ink)";
  return (
    <g>
      <title>{`${piece.id}, ${piece.length}`}</title>
      <path d={layout.pieceOutline(piece)} fill={done ? "var(--accent)" : "var(--steel-300)"} stroke="var(--steel-700)" strokeWidth={1} vectorEffect="non-scaling-stroke" />
      {(lettering === "level" ? [layout.mark(piece), piece.length] : []).map((line, index) => (
        <text key={index} x={x} y={y + layout.unit * (index === 0 ? -0.15 : 0.95)} textAnchor="middle" fontSize={layout.unit * 0.8} fill={ink}>{line}</text>
      ))}
      {lettering === "upright" ? <text x={x} y={y} transform={`rotate(-90 ${x} ${y})`} dy={layout.unit * 0.22} textAnchor="middle" fontSize={layout.unit * 0.62} fill={ink}>{layout.mark(piece)}</text> : null}
    </g>
  );
}
