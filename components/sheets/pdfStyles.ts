import { StyleSheet } from "@react-pdf/renderer";
import { paperColours as colours } from "@/lib/sheet/shapeLook";

const rule = `0.5pt solid ${colours["steel-300"]}`;
const ink = `1pt solid ${colours.ink}`;

/** Look of the PDF sheet, in points on A4. No line height on the page: with one, texts made while paging are dropped. */
export const pdfStyles = StyleSheet.create({
  page: { paddingTop: 28, paddingBottom: 40, paddingHorizontal: 30, fontFamily: ["Barlow", "Barlow ext"], fontSize: 8.5, color: colours.ink },
  head: { flexDirection: "row", borderTop: `2pt solid ${colours.ink}`, borderBottom: ink, paddingVertical: 5 },
  title: { fontSize: 15, fontWeight: 600, lineHeight: 1.35 },
  cells: { flexDirection: "row", flexWrap: "wrap" },
  cell: { marginRight: 14, marginTop: 3 },
  caption: { fontSize: 6.5, color: colours["ink-soft"], letterSpacing: 0.3 },
  strong: { fontWeight: 600 },
  mono: { fontFamily: ["Plex Mono", "Plex Mono ext"] },
  monoStrong: { fontFamily: ["Plex Mono", "Plex Mono ext"], fontWeight: 600 },
  state: { marginTop: 6, padding: 4, border: `1pt solid ${colours.brick}`, color: colours.brick, fontWeight: 600, fontSize: 10 },
  cautions: { marginTop: 7, paddingLeft: 6, borderLeft: `3pt solid ${colours.amber}`, flexDirection: "row", flexWrap: "wrap" },
  caution: { width: "50%", paddingRight: 10, marginBottom: 1.5, fontSize: 7.5 },
  columns: { flexDirection: "row", marginTop: 8 },
  heading: { fontSize: 7, fontWeight: 600, color: colours["ink-soft"], marginBottom: 2 },
  row: { flexDirection: "row", borderBottom: rule, paddingVertical: 1.2 },
  tableHead: { flexDirection: "row", borderTop: ink, borderBottom: rule, paddingVertical: 1.2, color: colours["ink-soft"], fontSize: 7 },
  step: { flexDirection: "row", borderBottom: rule, paddingVertical: 4 },
  stepNumber: { width: 34, alignItems: "center" },
  number: { fontFamily: "Plex Mono", fontWeight: 600, fontSize: 15, lineHeight: 1.1 },
  side: { marginTop: 3, width: 30, border: `1.2pt solid ${colours.ink}`, textAlign: "center", fontWeight: 700, fontSize: 7, paddingTop: 2, paddingBottom: 1 },
  pageNumber: { position: "absolute", top: 812, right: 30, width: 120, height: 14, textAlign: "right", fontSize: 7, color: colours["ink-soft"] },
  footer: { position: "absolute", top: 808, height: 20, left: 30, right: 30, flexDirection: "row", borderTop: rule, paddingTop: 3, gap: 24, fontSize: 7, color: colours["ink-soft"] },
});
