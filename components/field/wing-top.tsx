import { useRef } from "react";
import type { Member } from "@/lib/domain/member";
import { fieldWords } from "@/lib/domain/messages/field";
import { settingsWords } from "@/lib/domain/messages/settings";
import { useReturn } from "./screen-title";
import { WingLink } from "./wing-link";

const words = fieldWords.rigs;

const way = "flex min-h-field min-w-18 items-center justify-center px-2.5 underline";

/** The top of the wing: who this phone records for, and the ways to the settings and the desk. */
export function WingTop({ member }: { member: Member | undefined }) {
  const heading = useRef<HTMLHeadingElement>(null);
  useReturn(heading);
  return (
    <header className="flex flex-wrap items-center justify-between gap-x-4 pt-2 pr-1 pb-1 pl-4">
      <div className="min-w-0 flex-[1_1_9rem] py-1">
        <p className="min-h-[1.4em] text-[0.9375rem] text-soft">
          {member ? words.who(member.name, member.organisation.name) : fieldWords.product}
        </p>
        <h1 ref={heading} tabIndex={-1} className="text-[1.375rem] leading-[1.1] font-extrabold outline-none">
          {words.title}
        </h1>
      </div>
      <nav className="flex flex-wrap">
        <WingLink settings="1" className={way}>
          {settingsWords.link}
        </WingLink>
        <a href="/desk" className={way}>
          {words.desk}
        </a>
      </nav>
    </header>
  );
}
