import { useRef, useState, type ChangeEvent } from "react";
import { useFormContext } from "react-hook-form";
import { Button, buttonClass } from "@/components/ui/button";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import type { FieldError } from "@/lib/domain/problem";
import { finished, imported, type Draft } from "@/lib/domain/sheet/draft";
import { atField } from "@/lib/domain/sheet/draft-check";
import { placeOf } from "@/lib/domain/sheet/draft-places";
import { readSheet } from "@/lib/domain/sheet/sheet";
import { useDraftDesk } from "./draft-context";
import { Group } from "./part-fields";

type Came =
  | { kind: "taken"; file: string; before: Draft }
  | { kind: "newer"; version: number }
  | { kind: "unreadable" }
  | { kind: "wrong"; errors: FieldError[] };

/** Takes a sheet out of a file into the draft, and gives the draft away as one. */
export function FilesPanel() {
  const { replace } = useDraftDesk();
  const { getValues } = useFormContext();
  const [came, setCame] = useState<Came | null>(null);
  const input = useRef<HTMLInputElement>(null);
  const take = async ({ target }: ChangeEvent<HTMLInputElement>) => {
    const file = target.files?.[0];
    // Else the same file could not be chosen a second time.
    target.value = "";
    if (!file) return;
    const read = await sheetFrom(file);
    if (read.kind !== "sheet") return setCame(read);
    const before = structuredClone(getValues());
    setCame({ kind: "taken", file: file.name, before });
    replace(imported(read.sheet, before));
  };
  const give = () => {
    const sheet = finished(getValues(), () => crypto.randomUUID());
    download(`${sheet.name || words.unnamed}.sheet.json`, JSON.stringify(sheet, null, 2) + "\n");
  };
  return (
    <Group title={words.importTitle} lead={words.importLead}>
      <div className="mt-3 flex flex-wrap gap-2.5">
        <label className="relative flex cursor-pointer">
          <input
            ref={input}
            type="file"
            accept=".json,application/json"
            onChange={(event) => void take(event)}
            className="peer sr-only"
          />
          <span
            className={`${buttonClass("plain", "desk")} min-h-13 peer-focus-visible:outline-4 peer-focus-visible:outline-offset-2 peer-focus-visible:outline-now`}
          >
            {words.importButton}
          </span>
        </label>
        <Button size="desk" className="min-h-13" onClick={give}>
          {words.exportButton}
        </Button>
      </div>
      <div role="status" className="mt-3">
        {came?.kind === "taken" && (
          <p>
            {words.imported(came.file)}{" "}
            <button
              type="button"
              onClick={() => {
                replace(came.before);
                setCame(null);
              }}
              className="min-h-11 font-semibold underline underline-offset-4"
            >
              {words.importUndo}
            </button>
          </p>
        )}
        {came?.kind === "newer" && <p className="font-semibold">{words.importNewer(came.version)}</p>}
        {came?.kind === "unreadable" && <p className="font-semibold">{words.importUnreadable}</p>}
        {came?.kind === "wrong" && (
          <>
            <p className="font-semibold">{words.importWrong}</p>
            <ul className="list-disc pl-5">
              {came.errors.map(atField).map(({ pointer, detail }) => (
                <li key={pointer + detail}>{[placeOf(pointer).words, detail].filter(Boolean).join(": ")}</li>
              ))}
            </ul>
          </>
        )}
      </div>
    </Group>
  );
}

async function sheetFrom(file: File) {
  try {
    return readSheet(JSON.parse(await file.text()));
  } catch {
    return { kind: "unreadable" as const };
  }
}

function download(name: string, text: string): void {
  const address = URL.createObjectURL(new Blob([text], { type: "application/json" }));
  const link = document.createElement("a");
  link.href = address;
  link.download = name.replace(/[\\/:*?"<>|]/g, "-");
  link.click();
  URL.revokeObjectURL(address);
}
