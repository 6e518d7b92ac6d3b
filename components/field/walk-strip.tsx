import { Strip } from "@/components/tape/strip";
import type { WalkView } from "@/lib/client/recorder";
import { fieldWords } from "@/lib/domain/messages/field";
import { stepsOf, stripOf, tallyOf } from "./walk-plan";

type WalkStripProps = { view: WalkView; now?: string | null; size?: "field" | "small" };

/** A walk's strip of tape with its sentence for those who do not see it. */
export function WalkStrip({ view, now = null, size }: WalkStripProps) {
  const steps = stepsOf(view.document, view.walk);
  const { marks } = view.replay;
  const { total, lookedAt, holds, fixes } = tallyOf(view.document, steps, marks);
  const label = fieldWords.walk.strip({ total, lookedAt, holds: holds.length, fixes: fixes.length });
  return <Strip stations={stripOf(steps, marks, now)} label={label} size={size} />;
}
