import type { StepPicture } from "@/lib/sheet/pictureShape";
import { labelPaint, labelScale, shapeLook, type Paint } from "@/lib/sheet/shapeLook";
import { shapePath } from "@/lib/sheet/shapePath";

const paint = (name: Paint | null): string => (name === null ? "none" : `var(--${name})`);

/** A drawing of a step as SVG, in the colours of the theme around it. */
export function StepDrawing({ picture, label, className }: { readonly picture: StepPicture; readonly label: string; readonly className?: string }) {
  return (
    <svg viewBox={picture.box.join(" ")} role="img" aria-label={label} className={className} preserveAspectRatio="xMidYMid meet">
      {picture.shapes.map((shape, index) => {
        const look = shapeLook[shape.kind];
        return (
          <path key={index} d={shapePath(shape)} fill={shape.closed ? paint(look.fill) : "none"} fillRule="evenodd" stroke={paint(look.line)} strokeWidth={look.width}
            strokeDasharray={look.dash?.join(" ")} opacity={look.fade} strokeLinejoin="round" vectorEffect="non-scaling-stroke" />
        );
      })}
      {picture.labels.map((entry, index) => (
        <text key={index} x={entry.at[0]} y={entry.at[1]} textAnchor={entry.anchor} fontSize={picture.lettering * labelScale[entry.kind]} fill={paint(labelPaint[entry.kind])}
          fontWeight={entry.kind === "up" ? 700 : 500} stroke="var(--sheet)" strokeWidth={picture.lettering * 0.22} paintOrder="stroke">
          {entry.text}
        </text>
      ))}
    </svg>
  );
}
