import { Fragment } from "react";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import { RIG_NAME } from "@/lib/domain/sheet/sheet";
import { useDraftDesk } from "./draft-context";
import { FieldLine } from "./field-line";
import { FilesPanel } from "./files-panel";

const name = { kind: "text", most: RIG_NAME } as const;
const notes = { kind: "text", most: 1000, lines: true } as const;

/** What the rig is called, what else there is to say of it, and sheets from and to files. */
export function RigSection() {
  const { generation } = useDraftDesk();
  return (
    <>
      <Fragment key={generation}>
        <FieldLine name="name" field={name} words={words.name} required />
        <FieldLine name="notes" field={notes} words={words.notes} />
      </Fragment>
      <FilesPanel />
    </>
  );
}
