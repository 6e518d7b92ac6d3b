import { type ReactNode, useId } from "react";
import type { CalloutLetter } from "@/lib/domain/messages/drawings";

export type DrawingProps = {
  size?: "full" | "small";
  /** Called when someone touches a callout; a shortcut by hand only, never the one way to do it. */
  onCallout?: (letter: CalloutLetter) => void;
};

type FrameProps = {
  title: string;
  description: string;
  width?: number;
  height: number;
  /** Draws with the address of a hatch of its own: two drawings on a page must not share one. */
  children: (hatch: string) => ReactNode;
};

/** The sheet that a drawing is on: named, described, with a hatch for what is cut or lies behind. */
export function Frame({ title, description, width = 390, height, children }: FrameProps) {
  const id = useId();
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      role="img"
      aria-labelledby={`${id}-title`}
      aria-describedby={`${id}-desc`}
      className="dr"
    >
      <title id={`${id}-title`}>{title}</title>
      <desc id={`${id}-desc`}>{description}</desc>
      <defs>
        <pattern
          id={`${id}-hatch`}
          width="6.5"
          height="6.5"
          patternTransform="rotate(45)"
          patternUnits="userSpaceOnUse"
        >
          <path d="M0 0V6.5" className="dr-hatch-line" />
        </pattern>
      </defs>
      {children(`url(#${id}-hatch)`)}
    </svg>
  );
}
