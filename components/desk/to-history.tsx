import { walkWords } from "@/lib/domain/messages/desk";
import { BackLink } from "./back-link";

/** The way back, above a walk's title. */
export function ToHistory() {
  return <BackLink href="/desk" label={walkWords.back} />;
}
