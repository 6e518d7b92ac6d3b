import type { Waiting } from "@/lib/client/sign-up";
import { signUpWords } from "@/lib/domain/messages/account";

const words = signUpWords.bring;

/** The rigs and walks of this phone that a sign-up takes along. */
export function BringAlong({ waiting }: { waiting: Waiting }) {
  return (
    <section className="mt-6 border-y-hair border-rule bg-shade px-4 py-4">
      <h2 className="font-extrabold">{words.title}</h2>
      <ul className="mt-1.5">
        {waiting.rigs.map(({ id, name, walks }) => (
          <li key={id} className="flex flex-wrap justify-between gap-x-4 border-t-hair border-rule py-1.5">
            <span className="min-w-0">{name}</span>
            <span className="tabular text-base">{words.walks(walks)}</span>
          </li>
        ))}
      </ul>
      <p className="border-t-hair border-rule pt-2 text-base text-soft">{words.then}</p>
    </section>
  );
}
