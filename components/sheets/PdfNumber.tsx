import { Text, type TextProps } from "@react-pdf/renderer";
import { pdfStyles as styles } from "./pdfStyles";

interface PdfNumberProps {
  readonly children: string;
  readonly strong?: boolean;
  readonly style?: NonNullable<TextProps["style"]>;
}

/** Text in the tabular mono. Its file's blank has no outline, which the PDF writer cannot measure: blanks come from the text face. */
export function PdfNumber({ children, strong = false, style = {} }: PdfNumberProps) {
  const mono = strong ? styles.monoStrong : styles.mono;
  return (
    <Text style={style}>
      {children.split(/(\s+)/).map((piece, index) => (/\S/.test(piece) ? <Text key={index} style={mono}>{piece}</Text> : piece))}
    </Text>
  );
}
