import { useId } from "react";
import { RigCard } from "@/components/field/rig-card";
import type { KeptWalk } from "@/lib/client/walk-shelf";
import type { Bundle } from "@/lib/domain/field";
import { localWords as words } from "@/lib/domain/messages/account";

type LocalRigsProps = { local: Bundle; walks: readonly KeptWalk[] };

/** Beside an account's rigs: those that were made on this phone without one. */
export function LocalRigs({ local, walks }: LocalRigsProps) {
  const title = useId();
  return (
    <section aria-labelledby={title} className="mt-4 border-t-[3px] border-ink pt-4">
      <h2 id={title} className="px-4 text-xl font-extrabold">
        {words.title}
      </h2>
      <p className="px-4 pt-1 pb-4 text-base text-soft">{words.beside}</p>
      {local.rigs.map((rig) => (
        <RigCard key={rig.id} rig={rig} member={local.member} walks={walks} alone={false} />
      ))}
    </section>
  );
}
