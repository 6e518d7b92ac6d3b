import { useState, type ReactNode } from "react";
import { OriginLine } from "@/components/rigs/origin-line";
import { listedWords as words } from "@/lib/domain/messages/review";
import type { Check } from "@/lib/domain/revision";

type WhyListedProps = {
  check: Check;
  /** Something else is asked for now. */
  off: boolean;
  /** What the check asks and how to look. */
  children: ReactNode;
};

/**
 * The words of a check, and on a tap why it is on this list. On a phone the words themselves are what is tapped, so that
 * a target for a thumb takes a line and no more from the drawing; where there is room the reasons stand open.
 */
export function WhyListed({ check, off, children }: WhyListedProps) {
  const [openAt, setOpenAt] = useState<string | null>(null);
  const open = openAt === check.key;
  const { why, listed, origin } = check;
  // Lists from before the catalogue say neither; what a check is for stands on a wide screen all the same.
  const asked = !off && (listed !== undefined || origin !== undefined);
  return (
    <>
      <div className={asked ? "relative min-h-field md:min-h-0" : ""}>
        {children}
        {asked && (
          <>
            <span
              aria-hidden="true"
              className="block px-4 pt-1 text-base underline decoration-1 underline-offset-4 md:hidden"
            >
              {words.question}
            </span>
            <button
              type="button"
              aria-label={words.question}
              aria-expanded={open}
              onClick={() => setOpenAt(open ? null : check.key)}
              className="absolute inset-0 md:hidden"
            />
          </>
        )}
      </div>
      {!off && (
        <div
          className={`mx-4 mt-3 flex-col gap-3 border-t-hair border-rule pt-3 md:mt-5 md:flex md:pt-4 ${asked && open ? "flex" : "hidden"}`}
        >
          {why && <p className="text-soft">{why}</p>}
          {asked && (
            <dl className="flex flex-col gap-1.5 text-base">
              {listed && <Reason label={words.listed}>{listed}</Reason>}
              {origin && (
                <Reason label={words.origin}>
                  <OriginLine origin={origin} />
                </Reason>
              )}
            </dl>
          )}
        </div>
      )}
    </>
  );
}

function Reason({ label, children }: { label: string; children: ReactNode }) {
  return (
    <div className="min-w-0">
      <dt className="inline font-semibold">{label}: </dt>
      <dd className="inline">{children}</dd>
    </div>
  );
}
