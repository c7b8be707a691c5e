"use client";
import { DataTable, type Column } from "@/components/ui/DataTable";
import { StateMark } from "@/components/ui/StateMark";
import { formatLength } from "@/lib/format/formatLength";
import type { PieceView } from "@/lib/schemas/views";
import { PieceRack } from "./PieceRack";
import { PieceStateField } from "./PieceStateField";
import { pieceTone } from "./pieceStates";

const horns = { left: "left end", right: "right end", both: "both ends" } as const;

interface PieceTableProps {
  readonly pieces: readonly PieceView[];
  readonly mayWrite: boolean;
}

/** Each physical piece: where it lies and what state it is in. The toolroom changes both here. */
export function PieceTable({ pieces, mayWrite }: PieceTableProps) {
  const columns: readonly Column<PieceView>[] = [
    { key: "code", header: "Piece", rowHeader: true, cell: (piece) => <span className="num">{piece.code}</span> },
    { key: "length", header: "Length, mm", align: "right", cell: (piece) => <span className="num">{formatLength(piece.lengthMm, "mm", false)}</span> },
    { key: "horn", header: "Cut away", cell: (piece) => (piece.horn === null ? <span className="text-ink-faint">no</span> : horns[piece.horn]) },
    { key: "rack", header: "Rack place", className: "min-w-36", cell: (piece) => (mayWrite ? <PieceRack key={`${piece.id} ${piece.rack}`} piece={piece} /> : <span className="num">{piece.rack === "" ? "–" : piece.rack}</span>) },
    { key: "state", header: "State", className: "min-w-56", cell: (piece) => (mayWrite ? <PieceStateField piece={piece} /> : (
      <StateMark tone={pieceTone[piece.state]}>{piece.state}{piece.machine === null ? "" : `, ${piece.machine}`}</StateMark>
    )) },
  ];
  return <DataTable caption="Pieces of this tool" columns={columns} rows={pieces} rowKey={(piece) => piece.id} dense
    empty={<p className="border border-dashed border-rule-strong p-6 text-center text-ink-soft">No piece yet: the planner cannot use this tool.{mayWrite ? " Add the pieces that the shop owns." : ""}</p>} />;
}
