import type { Member } from "@/lib/domain/member";
import { fieldWords } from "@/lib/domain/messages/field";

const words = fieldWords.rigs;

/** The top of the wing: who this phone records for, and the way to the desk. */
export function WingTop({ member }: { member: Member | undefined }) {
  return (
    <header className="flex items-center justify-between gap-4 pt-2 pr-1 pb-1 pl-4">
      <div className="min-w-0 py-1">
        <p className="min-h-[1.4em] text-[0.9375rem] text-soft">
          {member ? words.who(member.name, member.organisation.name) : fieldWords.product}
        </p>
        <h1 className="text-[1.375rem] leading-[1.1] font-extrabold">{words.title}</h1>
      </div>
      <a
        href="/desk"
        className="flex min-h-field min-w-18 shrink-0 items-center justify-center px-3 underline"
      >
        {words.desk}
      </a>
    </header>
  );
}
