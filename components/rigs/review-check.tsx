import type { ReactNode } from "react";
import type { Reviewed } from "@/lib/domain/catalogue/reviewed";
import { reviewWords as words } from "@/lib/domain/messages/review";
import { OriginLine } from "./origin-line";

type ReviewCheckProps = {
  reviewed: Reviewed;
  /** The keys of the walk that is asked for, in walking order. */
  walk: readonly string[] | null;
};

/** One check of the catalogue whole: in or out and why, what it asks, what a fault does, where it comes from. */
export function ReviewCheck({ reviewed: { id, check, listed, reason, walks }, walk }: ReviewCheckProps) {
  const place = listed && walk ? walk.indexOf(check.key) + 1 : 0;
  return (
    <li
      id={id}
      className="grid scroll-mt-4 grid-cols-1 gap-x-8 gap-y-2 border-b border-rule py-4 text-base break-inside-avoid @3xl:grid-cols-[minmax(0,5fr)_minmax(0,7fr)] print:grid-cols-[minmax(0,5fr)_minmax(0,7fr)]"
    >
      <div className="grid grid-cols-[1.25rem_minmax(0,1fr)] content-start items-baseline gap-x-3">
        <span aria-hidden="true" className="tape flex w-4 self-start pt-1">
          <span className={`tape-seg h-5 ${listed ? "tape-good" : "tape-todo"}`} />
        </span>
        <div className="flex min-w-0 flex-col gap-1">
          <h3 className={`text-[1.125rem] leading-snug ${listed ? "font-extrabold" : "font-semibold"}`}>
            {check.ask}
          </h3>
          <p>
            <strong className="font-extrabold">{listed ? words.in : words.out}.</strong> {reason}
          </p>
          <p>{words.effect[check.effect]}.</p>
          <p className="text-soft">
            {capital(words.walks(walks))}
            {place > 0 && (
              <span className="tabular text-[0.9375em]">, {words.place(place, walk!.length)}</span>
            )}
            .{check.mayBeAbsent && ` ${words.mayBeAbsent}.`}
          </p>
          <p className="tabular text-[0.875rem] text-soft">{id}</p>
        </div>
      </div>
      <dl className="grid grid-cols-1 content-start gap-x-4 gap-y-1.5 @2xs:grid-cols-[7.5rem_minmax(0,1fr)] @max-3xl:pl-8 print:pl-0">
        <Row label={words.labels.how}>{check.how}</Row>
        <Row label={words.labels.why}>{check.why}</Row>
        <Row label={words.labels.mend}>{check.mend}</Row>
        {check.who && <Row label={words.labels.who}>{check.who}</Row>}
        {check.caution && (
          <Row label={words.labels.caution}>
            <span className="font-semibold">{check.caution}</span>
          </Row>
        )}
        {check.origin && (
          <Row label={words.labels.origin}>
            <OriginLine origin={check.origin} />
          </Row>
        )}
      </dl>
    </li>
  );
}

function Row({ label, children }: { label: string; children: ReactNode }) {
  return (
    <>
      <dt className="text-soft">{label}</dt>
      <dd className="min-w-0 @max-2xs:mb-1">{children}</dd>
    </>
  );
}

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);
