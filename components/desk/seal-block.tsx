import type { ReactNode } from "react";
import { durationText } from "@/lib/client/time-words";
import { bodyOf } from "@/lib/domain/entry";
import type { WalkReading } from "@/lib/domain/history";
import { walkWords } from "@/lib/domain/messages/desk";
import type { ClockRemark } from "@/lib/domain/walk-reading";
import { buttonClass } from "../ui/button";
import { InFours } from "./in-fours";
import { Instant } from "./instant";

type SealBlockProps = { reading: WalkReading; clock: ClockRemark | null };

/** What holds the record together: the signature, the receipt, the two clocks, and the record itself to take along. */
export function SealBlock({ reading, clock }: SealBlockProps) {
  const { walk, entries, seal, device } = reading;
  const key = entries[0] && bodyOf(entries[0].entry, "open")?.key;
  return (
    <section className="border-t-hair border-rule pt-4 text-base">
      <h2 className="text-xl leading-tight font-extrabold">
        {seal ? walkWords.sealTitle : walkWords.stillOpen(entries.length)}
      </h2>
      {seal && (
        <p className="mt-1">
          {walkWords.signedWith(seal.alg)}, received{" "}
          <span className="whitespace-nowrap">
            <Instant at={seal.receipt.receivedAt} />.
          </span>
        </p>
      )}
      {seal && seal.device !== device && <p className="mt-2 font-semibold">{walkWords.otherKey}</p>}
      {clock && (
        <p className="mt-2">
          {clock.kind === "ahead"
            ? walkWords.clockAhead(durationText(clock.byMs))
            : walkWords.clockApart(durationText(clock.byMs))}
        </p>
      )}
      <dl className="mt-3 space-y-3">
        {seal && (
          <Item label={walkWords.seal}>
            <InFours text={seal.seal} />
          </Item>
        )}
        {key && (
          <Item label={walkWords.deviceKey}>
            <InFours text={key} />
          </Item>
        )}
        {seal && (
          <Item label={walkWords.serverKey}>
            <InFours text={seal.receipt.kid} />
          </Item>
        )}
        <Item label={walkWords.rigSheet}>
          <InFours text={walk.revision} />
        </Item>
        <Item label={walkWords.entries}>
          <span className="tabular text-sm">{entries.length}</span>
        </Item>
      </dl>
      <a href={`/api/walks/${walk.id}/record`} download className={`${buttonClass("plain", "desk")} mt-5`}>
        {walkWords.record}
      </a>
      <p className="mt-2 text-soft">{walkWords.recordHint}</p>
    </section>
  );
}

function Item({ label, children }: { label: string; children: ReactNode }) {
  return (
    <div>
      <dt className="text-sm text-soft">{label}</dt>
      <dd>{children}</dd>
    </div>
  );
}
