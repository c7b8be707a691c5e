import { Document, Page, Path, Svg, Text, View } from "@react-pdf/renderer";
import type { SheetState } from "@/lib/schemas/views";
import { allowanceLine } from "@/lib/sheet/allowanceLine";
import { measurementTable } from "@/lib/sheet/measurementTable";
import { qrPath } from "@/lib/sheet/qrPath";
import { paperColours } from "@/lib/sheet/shapeLook";
import type { SheetView } from "@/lib/sheet/sheetView";
import { PdfBedMap } from "./PdfBedMap";
import { PdfStep } from "./PdfStep";
import { PdfTable } from "./PdfTable";
import { pdfStyles as styles } from "./pdfStyles";

interface SheetPdfProps {
  readonly view: SheetView;
  readonly state: SheetState;
  /** Who released it and when, in words; null before. */
  readonly released: string | null;
  /** The address of the sheet as it stands now. */
  readonly address: string;
}

/** The setup sheet on A4. Every number is the view's own text. */
export function SheetPdf({ view, state, released, address }: SheetPdfProps) {
  const measured = measurementTable(view.measurements);
  return (
    <Document title={`Setup sheet ${view.header.number}`} subject={`${view.header.partNumber} ${view.header.partName}`} creator="Foldwright" producer="Foldwright">
      <Page size="A4" style={styles.page}>
        <View style={styles.footer} fixed>
          <Text>{view.header.number} · {view.header.partNumber} revision {view.header.revision}</Text>
          <Text>Advice only: makers’ ratings, local codes and trained people decide.</Text>
        </View>
        <Text fixed style={styles.pageNumber} render={({ pageNumber, totalPages }) => `Page ${pageNumber} of ${totalPages}`} />
        <PdfHead view={view} released={released} address={address} />
        {state === "released" ? null : <Text style={styles.state}>{state === "draft" ? "DRAFT: not for the floor" : "SUPERSEDED: do not work from this sheet"}</Text>}
        <View style={styles.cautions}>
          {view.cautions.map((caution, index) => (
            <Text key={index} style={{ ...styles.caution, ...(caution.level === "stop" ? styles.strong : {}) }}>
              {caution.level === "stop" ? "Stop: " : ""}{caution.text}{caution.steps.length > 0 ? ` (step ${caution.steps.join(", ")})` : ""}
            </Text>
          ))}
        </View>
        <View style={styles.columns}>
          <View style={{ flexGrow: 3, flexShrink: 1, flexBasis: 0, paddingRight: 14 }}>
            <Text style={styles.heading}>Tools to fetch</Text>
            <PdfTable heads={["Piece", "Kind", "Length", "Horn", "Rack", "At"]} shares={[5.2, 1.5, 1.7, 1.9, 1.7, 0.7]} rows={view.pickList.map((line) => [line.piece, line.kind, line.length, line.horn, line.rack, line.station])} />
          </View>
          <View style={{ flexGrow: 2, flexShrink: 1, flexBasis: 0 }}>
            <Text style={styles.heading}>Measure on the first part</Text>
            <PdfTable heads={measured.heads} shares={[4, 2, 2.2, 2.2].slice(0, measured.heads.length)} rows={measured.rows} />
            <Text style={{ fontSize: 6.5, marginTop: 2 }}>{measured.note}</Text>
          </View>
        </View>
        <View style={{ marginTop: 8 }} wrap={false}>
          <Text style={styles.heading}>Bed, seen by the operator ({view.bedMap.length} long; tools at scale)</Text>
          <PdfBedMap map={view.bedMap} width={535} close />
        </View>
        <Text style={{ ...styles.heading, marginTop: 8, borderBottom: `1pt solid ${paperColours.ink}`, paddingBottom: 2 }} minPresenceAhead={90}>Bends in order</Text>
        {view.steps.map((step) => <PdfStep key={step.number} step={step} />)}
        <View style={{ marginTop: 6, fontSize: 7, color: paperColours["ink-soft"] }} wrap={false}>
          <Text>Blank {view.flat.width} × {view.flat.depth}, {view.flat.mass}. Allowances: {allowanceLine(view.flat)}.</Text>
          <Text>{view.header.conventions.join(" ")}</Text>
        </View>
      </Page>
    </Document>
  );
}

function PdfHead({ view: { header }, released, address }: Pick<SheetPdfProps, "view" | "released" | "address">) {
  const code = qrPath(address);
  const cells = [
    ["Sheet", header.number], ["Part", header.partNumber], ["Revision", header.revision], ["Brake", header.machine], ["Material", header.material], ["Thickness", header.thickness],
    ["Batch", header.batch], ["Units", header.units], ["Setup", header.setupTime], ["A part", header.timePerPart], ["Released", released ?? "not released"],
  ] as const;
  return (
    <View style={styles.head}>
      <View style={{ flexGrow: 1, flexShrink: 1, flexBasis: 0 }}>
        <Text style={styles.title}>{header.partName}</Text>
        <View style={styles.cells}>
          {cells.map(([label, value]) => <View key={label} style={styles.cell}><Text style={styles.caption}>{label}</Text><Text style={styles.strong}>{value}</Text></View>)}
        </View>
      </View>
      <View style={{ alignItems: "center" }}>
        <Svg viewBox={`0 0 ${code.size} ${code.size}`} width={66} height={66}><Path d={code.path} fill="#000000" /></Svg>
        <Text style={{ fontSize: 6 }}>the sheet as it stands now</Text>
      </View>
    </View>
  );
}
