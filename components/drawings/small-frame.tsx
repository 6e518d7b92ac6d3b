import type { ReactNode } from "react";
import { Frame } from "./frame";

type SmallFrameProps = { title: string; description: string; children: (hatch: string) => ReactNode };

/** The small drawing for a row: 88 by 74, no words on it. */
export function SmallFrame(props: SmallFrameProps) {
  return <Frame {...props} width={88} height={74} />;
}
