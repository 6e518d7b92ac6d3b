import type { ReactNode } from "react";

/** A part of the settings under its own heading. */
export function SettingsSection({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section>
      <h2 className="pb-2 text-xl leading-tight font-extrabold">{title}</h2>
      <div className="flex flex-col gap-3">{children}</div>
    </section>
  );
}
