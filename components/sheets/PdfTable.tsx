import { Text, View } from "@react-pdf/renderer";
import { PdfNumber } from "./PdfNumber";
import { pdfStyles as styles } from "./pdfStyles";

interface PdfTableProps {
  readonly heads: readonly string[];
  readonly rows: readonly (readonly string[])[];
  /** Relative widths. */
  readonly shares: readonly number[];
}

export function PdfTable({ heads, rows, shares }: PdfTableProps) {
  const cell = (column: number) => ({ flexGrow: shares[column] ?? 1, flexShrink: 1, flexBasis: 0, paddingRight: 4 });
  return (
    <View>
      <View style={styles.tableHead}>{heads.map((head, column) => <Text key={head} style={cell(column)}>{head}</Text>)}</View>
      {rows.map((row, index) => (
        <View key={index} style={styles.row} wrap={false}>
          {row.map((text, column) => <PdfNumber key={column} strong={column === 0} style={{ ...cell(column), fontSize: 7.5 }}>{text}</PdfNumber>)}
        </View>
      ))}
    </View>
  );
}
