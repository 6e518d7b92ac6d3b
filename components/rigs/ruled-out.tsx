import { rigWords as words } from "@/lib/domain/messages/rigs";
import { Notice } from "../ui/notice";

/** What on a sheet rules its rig out: do not tow, with every reason. Nothing where there is none. */
export function RuledOut({ reasons }: { reasons: readonly string[] }) {
  if (reasons.length === 0) return null;
  return (
    <section className="mt-4">
      <h2 className="sr-only">{words.ruledOut}</h2>
      <Notice tone="hold" title={words.ruledOut}>
        <p>{words.ruledOutWhy}</p>
        <ul className="mt-1 ml-5 list-disc font-semibold">
          {reasons.map((reason) => (
            <li key={reason}>{reason}</li>
          ))}
        </ul>
      </Notice>
      <p className="mt-2 max-w-prose text-base text-soft">{words.ruledOutThen}</p>
    </section>
  );
}
