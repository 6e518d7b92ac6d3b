import { walkWords } from "@/lib/domain/messages/desk";
import { Skeleton } from "../ui/skeleton";
import { DeskHeading } from "./desk-heading";
import { ToHistory } from "./to-history";

/** A walk's page while the walk is on its way. */
export function WalkFetching() {
  return (
    <>
      <DeskHeading over={<ToHistory />} title={walkWords.plainTitle} />
      <Skeleton label={walkWords.fetching} rows={5} />
    </>
  );
}
