import { listDifferences, type ListDifference } from "@/lib/domain/catalogue/differences";
import type { Purpose } from "@/lib/domain/entry";
import { effectWords, listChangeWords as words, revisionsWords } from "@/lib/domain/messages/rigs";
import { purposeWords } from "@/lib/domain/messages/walk";
import { checksOf, type Check, type RevisionDocument } from "@/lib/domain/revision";

type ListChangesProps = { before: RevisionDocument; after: RevisionDocument };

/** What differs between two lists: what comes on, what goes off, and what is put differently. */
export function ListChanges({ before, after }: ListChangesProps) {
  const differences = listDifferences(before, after);
  const [was, is] = [checksOf(before), checksOf(after)];
  if (differences.length === 0) return <p className="mt-2 text-base">{revisionsWords.nothingOnList}</p>;
  return (
    <ul className="mt-2 border-t border-rule text-base">
      {differences.map((difference) => (
        <li
          key={difference.key}
          className="grid grid-cols-1 gap-x-4 border-b border-rule py-2 @lg:grid-cols-[6.5rem_minmax(0,1fr)]"
        >
          <span className="font-extrabold">{words[difference.change]}</span>
          <div className="min-w-0">
            <p className="font-semibold">{difference.ask}</p>
            {difference.members?.map((member) => (
              <Member
                key={member}
                member={member}
                was={was.get(difference.key)!}
                is={is.get(difference.key)!}
              />
            ))}
            <Walks walks={difference.walks} />
          </div>
        </li>
      ))}
    </ul>
  );
}

function Member({ member, was, is }: { member: string; was: Check; is: Check }) {
  const [before, after] = [sayOf(was, member), sayOf(is, member)];
  return (
    <p>
      <span className="text-soft">{words.members[member] ?? member}</span>
      {(before !== null || after !== null) && (
        <>
          <span className="text-soft">: </span>
          {before !== null && <del className="decoration-1">{before}</del>}
          {before !== null && after !== null && " "}
          {after !== null && <ins className="font-semibold no-underline">{after}</ins>}
        </>
      )}
    </p>
  );
}

function Walks({ walks }: { walks: ListDifference["walks"] }) {
  if (!walks) return null;
  const lines: [(names: string) => string, Purpose[]][] = [
    [words.walksAdded, walks.added],
    [words.walksRemoved, walks.removed],
    [words.walksMoved, walks.moved],
  ];
  return lines.map(
    ([say, purposes], at) =>
      purposes.length > 0 && <p key={at}>{say(purposes.map((each) => purposeWords[each]).join(", "))}</p>,
  );
}

/** A member of a check that is a sentence; null for one that is not there, or is more than one. */
function sayOf(check: Check, member: string): string | null {
  const value = check[member];
  if (member === "effect") return effectWords[check.effect];
  if (member === "origin") return check.origin?.says ?? null;
  return typeof value === "string" ? value : null;
}
