import { walkWords as words } from "@/lib/domain/messages/desk";
import { Gone } from "./gone";

/** An id behind which there is no walk, or none for this member. */
export function WalkGone() {
  return (
    <Gone
      page={words.plainTitle}
      title={words.goneTitle}
      text={words.gone}
      href="/desk"
      to={words.toHistory}
    />
  );
}
