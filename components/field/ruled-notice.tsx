import { Notice } from "@/components/ui/notice";
import { fieldWords } from "@/lib/domain/messages/field";
import { ruledBy, type RevisionDocument } from "@/lib/domain/revision";

/** What on its sheet rules a rig out, wherever a walk of it begins or ends. */
export function RuledNotice({ document }: { document: RevisionDocument }) {
  const checks = ruledBy(document);
  if (checks.length === 0) return null;
  return (
    <Notice tone="hold" title={fieldWords.rigs.ruled}>
      {checks.map(({ key, how }) => (
        <p key={key}>{how}</p>
      ))}
    </Notice>
  );
}
