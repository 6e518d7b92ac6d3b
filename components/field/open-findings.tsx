import type { BundleRig } from "@/lib/domain/field";
import { fieldWords } from "@/lib/domain/messages/field";
import { checksOf } from "@/lib/domain/revision";
import { recentText } from "@/lib/client/time-words";
import { useNowMs } from "./now";

/** What is still open on a rig from earlier walks; a hold among it means do not tow, whatever this walk says. */
export function OpenFindings({ rig }: { rig: BundleRig | undefined }) {
  const nowMs = useNowMs();
  if (!rig || rig.openFindings.length === 0) return null;
  const checks = checksOf(rig.revision.document);
  return (
    <ul className="flex flex-col gap-1">
      {rig.openFindings.map(({ id, check, effect, since }) => {
        const words = effect === "hold" ? fieldWords.rigs.openFinding : fieldWords.rigs.openFix;
        return (
          <li key={id} className={`leading-snug font-semibold ${effect === "hold" ? "text-hold" : ""}`}>
            {words(recentText(since, nowMs), checks.get(check)?.ask ?? "")}
          </li>
        );
      })}
    </ul>
  );
}
