import { Path, Svg, Text } from "@react-pdf/renderer";
import type { StepPicture } from "@/lib/sheet/pictureShape";
import { labelPaint, labelScale, paperColours, shapeLook } from "@/lib/sheet/shapeLook";
import { shapePath } from "@/lib/sheet/shapePath";

/** A step's drawing in a PDF, as large as fits into a box of points. */
export function PdfDrawing({ picture, width, height }: { readonly picture: StepPicture; readonly width: number; readonly height: number }) {
  const [, , boxWidth, boxHeight] = picture.box;
  const scale = Math.min(width / boxWidth, height / boxHeight);
  return (
    <Svg viewBox={picture.box.join(" ")} width={width} height={height}>
      {picture.shapes.map((shape, index) => {
        const look = shapeLook[shape.kind];
        const line = (look.width * 0.6) / scale;
        return (
          <Path key={index} d={shapePath(shape)} fill={shape.closed && look.fill ? paperColours[look.fill] : "none"} fillRule="evenodd" stroke={look.line ? paperColours[look.line] : "none"} strokeWidth={line}
            {...(look.dash ? { strokeDasharray: look.dash.map((part) => (part * 0.6) / scale).join(" ") } : {})} opacity={look.fade ?? 1} />
        );
      })}
      {picture.labels.map((label, index) => (
        <Text key={index} x={label.at[0]} y={label.at[1]} textAnchor={label.anchor} fill={paperColours[labelPaint[label.kind]]}
          style={{ fontFamily: "Barlow", fontWeight: label.kind === "up" ? 700 : 600, fontSize: picture.lettering * labelScale[label.kind] }}>
          {label.text}
        </Text>
      ))}
    </Svg>
  );
}
