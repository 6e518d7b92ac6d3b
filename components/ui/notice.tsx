import type { ReactNode } from "react";

type NoticeProps = {
  /** caution: what can happen, then who decides. hold: do not tow, and nothing else. plain: a remark. */
  tone?: "caution" | "hold" | "plain";
  title?: ReactNode;
  children?: ReactNode;
  /** Announce it when it appears. */
  live?: boolean;
};

/** A block set apart from the text around it; a caution carries a band of tape, a hold the red band. */
export function Notice({ tone = "caution", title, children, live = false }: NoticeProps) {
  const role = live ? (tone === "hold" ? "alert" : "status") : undefined;
  if (tone === "hold") {
    return (
      <div role={role} className="hold-band px-4 py-5 text-paper">
        {title && <p className="max-w-[68%] text-[2.5rem] leading-none font-extrabold">{title}</p>}
        {children && <div className="mt-2 max-w-[68%] text-[1.0625rem]">{children}</div>}
      </div>
    );
  }
  return (
    <div role={role} className="flex gap-3 border-y-hair border-rule bg-shade py-3 pr-4 pl-3">
      {tone === "caution" && <div aria-hidden="true" className="tape-band w-2.5 shrink-0" />}
      <div className="min-w-0 flex-1">
        {title && <p className="text-xl leading-snug font-extrabold">{title}</p>}
        {children && <div className="text-[1.0625rem]">{children}</div>}
      </div>
    </div>
  );
}
