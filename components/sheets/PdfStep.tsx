import { Text, View } from "@react-pdf/renderer";
import type { SheetStep } from "@/lib/sheet/sheetView";
import { PdfDrawing } from "./PdfDrawing";
import { PdfNumber } from "./PdfNumber";
import { pdfStyles as styles } from "./pdfStyles";

/** One row of the bend table, never broken over pages. */
export function PdfStep({ step }: { readonly step: SheetStep }) {
  const numbers = [
    ["Gauge X", step.gaugeX], ["R", step.gaugeR], ["Z", step.gaugeZ], ["Angle", step.angle], ["Included", step.includedAngle], ["Demanded", step.demandedAngle], ["Force", step.force], ["Depth", step.depth],
  ] as const;
  const words = [
    ["Up", step.up], ["In front", step.front], ["To gauge", step.toGauge], ["Handling", step.handling], ["Punch", step.punch], ["Die", step.die], ["Station", step.station], ["Along the bed", step.bendZ],
  ] as const;
  return (
    <View style={styles.step} wrap={false}>
      <View style={styles.stepNumber}>
        <Text style={styles.number}>{step.number}</Text>
        <Text style={styles.side}>{step.upSide}</Text>
      </View>
      <PdfDrawing picture={step.picture} width={102} height={74} />
      <View style={{ width: 4 }} />
      <PdfDrawing picture={step.above} width={102} height={74} />
      <View style={{ flexGrow: 1, flexShrink: 1, flexBasis: 0, paddingLeft: 6 }}>
        <Text style={styles.strong}>{step.bends}</Text>
        <View style={styles.cells}>
          {numbers.map(([label, value]) => (
            <View key={label} style={{ marginRight: 7, marginTop: 2 }}><Text style={styles.caption}>{label}</Text><PdfNumber strong>{value}</PdfNumber></View>
          ))}
        </View>
        <View style={{ ...styles.cells, marginTop: 3 }}>
          {words.map(([label, value]) => <Text key={label} style={{ fontSize: 7.5, marginRight: 8 }}>{label}: <Text style={styles.strong}>{value}</Text></Text>)}
        </View>
      </View>
    </View>
  );
}
