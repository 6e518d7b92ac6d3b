import { useQuery } from "@tanstack/react-query";
import { useId, useState } from "react";
import { useFormContext } from "react-hook-form";
import { readThing, readThings } from "@/lib/client/sheet-saving";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import { isFilled, partIn, type Part } from "@/lib/domain/sheet/draft-sections";
import { useDraftDesk } from "./draft-context";
import { inputLook } from "./not-known";

const thingsQuery = {
  queryKey: ["things-for-sheet"],
  queryFn: async () => {
    const answer = await readThings();
    return answer.kind === "answered" ? answer.value.things : [];
  },
  staleTime: 60_000,
};

/** Offers what was written down before for a thing that is still empty, and a fresh start for one that is replaced. */
export function BookChoice({ part }: { part: Part }) {
  const { sheet, isNew } = useDraftDesk();
  const values = partIn(sheet, part) ?? {};
  const empty = Object.keys(part.fields).every((key) => key === "there" || !isFilled(values[key]));
  if (empty && values.there !== false) return <FromTheBook part={part} />;
  return !isNew && typeof values.id === "string" ? <Replaced part={part} /> : null;
}

function FromTheBook({ part }: { part: Part }) {
  const { data: things = [] } = useQuery(thingsQuery);
  const { getValues } = useFormContext();
  const { replace } = useDraftDesk();
  const [failed, setFailed] = useState(false);
  const id = useId();
  const kept = things.filter(({ kind }) => kind === part.key);
  if (kept.length === 0) return null;
  const take = async (thing: string) => {
    const answer = await readThing(thing);
    const state = answer.kind === "answered" && answer.value.history.find((row) => row.state)?.state;
    setFailed(!state);
    if (state) replace(withPart(getValues(), part, { ...state, id: thing }));
  };
  return (
    <div className="mt-3 border-2 border-dashed border-edge p-3">
      <label htmlFor={id} className="font-semibold">
        {words.bookLabel(part.title)}
      </label>
      <p id={`${id}-lead`} className="mb-2 text-base text-soft">
        {words.bookLead}
      </p>
      <select
        id={id}
        aria-describedby={`${id}-lead`}
        value=""
        onChange={({ target }) => void take(target.value)}
        className={inputLook(false)}
      >
        <option value="">{words.bookPick}</option>
        {kept.map(({ id: thing, label, rigs }) => (
          <option key={thing} value={thing}>
            {[label, ...rigs.map(({ name }) => name)].join(", ")}
          </option>
        ))}
      </select>
      {failed && (
        <p role="alert" className="mt-2 font-semibold">
          {words.bookFailed}
        </p>
      )}
    </div>
  );
}

function Replaced({ part }: { part: Part }) {
  const { getValues } = useFormContext();
  const { replace } = useDraftDesk();
  const fresh = "there" in part.fields ? { there: true } : {};
  return (
    <button
      type="button"
      onClick={() => replace(withPart(getValues(), part, fresh))}
      className="mt-2 min-h-11 text-left text-base leading-tight"
    >
      <span className="font-semibold underline underline-offset-4">{words.replaced}.</span>{" "}
      <span className="text-soft">{words.replacedHint}</span>
    </button>
  );
}

function withPart(draft: Record<string, unknown>, { path, key }: Part, values: Record<string, unknown>) {
  if (path.length === 1) return { ...draft, [key]: values };
  return { ...draft, gear: { ...(draft.gear as object | undefined), [key]: values } };
}
