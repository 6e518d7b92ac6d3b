import type { ReactNode } from "react";

type EmptyStateProps = { title: ReactNode; children?: ReactNode; action?: ReactNode };

/** What stands where there is nothing yet: why it is empty and the one thing to do about it. */
export function EmptyState({ title, children, action }: EmptyStateProps) {
  return (
    <div className="flex flex-col items-start gap-3 border-y-hair border-rule px-4 py-8">
      <div aria-hidden="true" className="flex gap-0.5">
        {["a", "b", "c", "d"].map((key) => (
          <div key={key} className="unlit h-6.5 w-4 border-hair border-soft" />
        ))}
      </div>
      <p className="text-xl leading-snug font-extrabold">{title}</p>
      {children && <div className="max-w-prose text-soft">{children}</div>}
      {action}
    </div>
  );
}
