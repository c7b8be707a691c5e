import { G, Line, Path, Rect, Svg, Text } from "@react-pdf/renderer";
import type { BedMap } from "@/lib/sheet/bedMap";
import { bedMapLayout } from "@/lib/sheet/bedMapLayout";
import { paperColours as colours } from "@/lib/sheet/shapeLook";

/** The bed map in a PDF: the same layout as on screen. */
export function PdfBedMap({ map, width, close = false }: { readonly map: BedMap; readonly width: number; readonly close?: boolean }) {
  const layout = bedMapLayout(map, close);
  const { box, unit, rows, bed } = layout;
  const scale = width / box[2];
  const thin = 0.6 / scale;
  const letter = (size: number, weight: 400 | 600 = 400) => ({ fontFamily: "Barlow", fontSize: unit * size, fontWeight: weight });
  return (
    <Svg viewBox={box.join(" ")} width={width} height={box[3] * scale}>
      <Rect x={bed[0]} y={rows.punch[0]} width={bed[1] - bed[0]} height={rows.die[1] - rows.punch[0]} fill={colours["steel-100"]} stroke={colours["steel-400"]} strokeWidth={thin} />
      <Line x1={0} x2={0} y1={rows.punch[0]} y2={rows.die[1]} stroke={colours["ink-soft"]} strokeWidth={thin} strokeDasharray={`${6 / scale} ${2 / scale}`} />
      {map.stations.map((station) => (
        <G key={station.id}>
          {station.pieces.map((piece) => {
            const [top, bottom] = piece.kind === "punch" ? rows.punch : rows.die;
            const lettering = layout.lettering(piece);
            const [x, y] = [(piece.from + piece.to) / 2, (top + bottom) / 2];
            return (
              <G key={`${piece.kind} ${piece.from}`}>
                <Path d={layout.pieceOutline(piece)} fill={colours["steel-300"]} stroke={colours["steel-700"]} strokeWidth={thin} />
                {(lettering === "level" ? [layout.mark(piece), piece.length] : []).map((line, index) => (
                  <Text key={index} x={x} y={y + unit * (index === 0 ? -0.15 : 0.95)} textAnchor="middle" fill={colours.ink} style={letter(0.8)}>{line}</Text>
                ))}
                {lettering === "upright" ? (
                  <G transform={`rotate(-90 ${x} ${y})`}><Text x={x} y={y + unit * 0.22} textAnchor="middle" fill={colours.ink} style={letter(0.62)}>{layout.mark(piece)}</Text></G>
                ) : null}
              </G>
            );
          })}
          <Text x={(station.from + station.to) / 2} y={rows.title} textAnchor="middle" fill={colours.ink} style={letter(1.3, 600)}>{station.id}</Text>
          <Text x={layout.names(station.id).x} y={rows.punchName} textAnchor={layout.names(station.id).anchor} fill={colours.ink} style={letter(0.9)}>{station.punch}</Text>
          <Text x={layout.names(station.id).x} y={rows.dieName} textAnchor={layout.names(station.id).anchor} fill={colours.ink} style={letter(0.9)}>{station.die}</Text>
          <Text x={station.from} y={rows.places} textAnchor="middle" fill={colours["ink-soft"]} style={letter(0.9)}>{station.fromText}</Text>
          <Text x={station.to} y={rows.places + unit * 1.1} textAnchor="middle" fill={colours["ink-soft"]} style={letter(0.9)}>{station.toText}</Text>
        </G>
      ))}
      {map.bends.map((bend) => (
        <G key={bend.step}>
          <Line x1={bend.from} x2={bend.to} y1={layout.bendLine(bend.step)} y2={layout.bendLine(bend.step)} stroke={colours.accent} strokeWidth={1.6 / scale} />
          <Text x={bend.to + unit * 0.4} y={layout.bendLine(bend.step) + unit * 0.3} fill={colours.accent} style={letter(0.85, 600)}>{String(bend.step)}</Text>
        </G>
      ))}
    </Svg>
  );
}
