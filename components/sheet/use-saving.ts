import { useQueryClient } from "@tanstack/react-query";
import { useRouter } from "next/navigation";
import { useState } from "react";
import { useFormContext } from "react-hook-form";
import { dropDraft } from "@/lib/client/sheet-draft";
import { sendSheetPhotos, sheetPhotoSaved } from "@/lib/client/sheet-photo";
import { readRig, saveSheet } from "@/lib/client/sheet-saving";
import type { FieldError, ProblemDocument } from "@/lib/domain/problem";
import type { RigReading } from "@/lib/domain/rigs";
import { finished } from "@/lib/domain/sheet/draft";
import { atField } from "@/lib/domain/sheet/draft-check";
import { parts, partIn } from "@/lib/domain/sheet/draft-sections";
import { mergeSheets, type Merged } from "@/lib/domain/sheet/draft-merge";
import { sheetIn, type Sheet } from "@/lib/domain/sheet/sheet";
import { sheetStore } from "./browser-sheet";
import { useDraftDesk } from "./draft-context";
import { nameOf } from "./places";
import type { SectionBodyProps } from "./section-body";

/** Someone else has saved meanwhile: their revision, and both changes over the one that both began with. */
export interface Stale {
  reading: RigReading;
  theirs: Sheet;
  merged: Merged;
}

export type Saving =
  | { is: "idle" | "saving" | "faulty" | "unreached" | "signed-out" }
  | { is: "refused"; problem: ProblemDocument; errors: FieldError[] }
  | { is: "stale"; stale: Stale };

type Ground = Pick<SectionBodyProps, "base" | "keeper" | "onCheck" | "onBase">;

/** Saves the draft as a revision, and deals with every answer that can come. */
export function useSaving({ base, keeper, onCheck, onBase }: Ground) {
  const { rig, replace } = useDraftDesk();
  const form = useFormContext();
  const router = useRouter();
  const queries = useQueryClient();
  const [saving, setSaving] = useState<Saving>({ is: "idle" });

  const save = async () => {
    if (saving.is === "saving") return;
    if (!(await onCheck())) return setSaving({ is: "faulty" });
    const sheet = finished(form.getValues(), () => crypto.randomUUID());
    // Kept, so that a second try after a lost answer names the same things.
    for (const part of Object.values(parts)) {
      const id = partIn(sheet, part)?.id;
      if (part.thing && id) form.setValue([...part.path, "id"].join("."), id);
    }
    await send(sheet, base.base);
  };

  /** Saves both people's changes over the other one's revision. */
  const saveMerged = async ({ reading, theirs }: Stale, sheet: Sheet) => {
    const next = { base: reading.revision.digest, baseSheet: theirs };
    replace({ ...sheet });
    onBase(next);
    await send(sheet, next.base);
  };

  const send = async (sheet: Sheet, over: string | null) => {
    setSaving({ is: "saving" });
    const answer = await saveSheet(rig, over, sheet);
    if (answer.kind === "unreached") return setSaving({ is: "unreached" });
    if (answer.kind === "answered") return arrived(sheet);
    const { problem } = answer;
    if (problem.code === "signed-out") return setSaving({ is: "signed-out" });
    // A new rig that exists: it was saved from here before, and the way back led to an empty form.
    if (problem.code === "stale-base" || (problem.code === "id-taken" && over === null)) return meet(sheet);
    const errors = (problem.errors ?? []).map(({ pointer, detail }) =>
      atField({ pointer: pointer.replace(/^\/sheet(?=\/|$)/, ""), detail }),
    );
    for (const { pointer, detail } of errors)
      form.setError(nameOf(pointer), { type: "server", message: detail });
    setSaving({ is: "refused", problem, errors });
  };

  const meet = async (mine: Sheet) => {
    const answer = await readRig(rig);
    const theirs = answer.kind === "answered" ? sheetIn(answer.value.document) : null;
    if (answer.kind !== "answered" || !theirs) return setSaving({ is: "unreached" });
    const before = base.baseSheet ?? { v: 1, name: theirs.name };
    setSaving({
      is: "stale",
      stale: { reading: answer.value, theirs, merged: mergeSheets(before, mine, theirs) },
    });
  };

  const arrived = async (sheet: Sheet) => {
    keeper.stop();
    const store = sheetStore();
    await dropDraft(store, rig).catch(() => {});
    const photo = sheet.procedure?.photo;
    if (photo) await sheetPhotoSaved(store, photo.sha256).catch(() => {});
    void sendSheetPhotos(store).catch(() => {});
    void queries.invalidateQueries();
    router.push(`/desk/rig?id=${rig}`);
  };

  return { saving, save, saveMerged };
}
