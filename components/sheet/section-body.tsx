import { Fragment } from "react";
import type { DraftKeeper } from "@/lib/client/sheet-draft";
import type { FieldError } from "@/lib/domain/problem";
import { partShows, sectionParts, type SectionKey } from "@/lib/domain/sheet/draft-sections";
import type { Sheet } from "@/lib/domain/sheet/sheet";
import { useDraftDesk } from "./draft-context";
import { LookOver } from "./look-over";
import { ManualSection } from "./manual-section";
import { PartFields } from "./part-fields";
import { RigSection } from "./rig-section";
import { WiringEditor } from "./wiring-editor";

/** The revision that a draft was begun over. */
export interface Base {
  base: string | null;
  baseSheet: Sheet | null;
}

export type SectionBodyProps = {
  section: SectionKey;
  base: Base;
  faults: readonly FieldError[];
  warnings: readonly FieldError[];
  keeper: DraftKeeper;
  /** Checks the draft; resolves to whether it can be saved. */
  onCheck: () => Promise<boolean>;
  onGo: (section: SectionKey, field?: string) => void;
  onBase: (base: Base) => void;
};

/** What stands in a section. */
export function SectionBody({ section, ...rest }: SectionBodyProps) {
  const { sheet, generation } = useDraftDesk();
  if (section === "rig") return <RigSection />;
  if (section === "manual") return <ManualSection key={generation} />;
  if (section === "look") return <LookOver {...rest} />;
  const shown = sectionParts[section].filter((key) => partShows(sheet, key));
  return (
    <Fragment key={generation}>
      {shown.map((key) => (
        <PartFields key={key} part={key} alone={shown.length === 1} />
      ))}
      {section === "wiring" && <WiringEditor />}
    </Fragment>
  );
}
