import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import { Missing } from "./missing";
import { Group } from "./part-fields";
import { PlaceLinks } from "./place-links";
import { SavePanel } from "./save-panel";
import type { SectionBodyProps } from "./section-body";
import { WhatComesOut } from "./what-comes-out";

/** Everything before saving: what cannot be so, what rules the rig out, what is missing, what comes of it. */
export function LookOver(props: Omit<SectionBodyProps, "section">) {
  const { faults, warnings, onGo } = props;
  return (
    <>
      {faults.length > 0 && (
        <Group title={words.errorsTitle} lead={words.errorsLead}>
          <PlaceLinks errors={faults} onGo={onGo} />
        </Group>
      )}
      <WhatComesOut wrong={faults.length > 0} />
      <Group title={words.missingTitle}>
        <Missing onGo={onGo} />
      </Group>
      {warnings.length > 0 && (
        <Group title={words.warningsTitle} lead={words.warningsLead}>
          <PlaceLinks errors={warnings} onGo={onGo} />
        </Group>
      )}
      <Group title={words.saveTitle} lead={words.saveLead}>
        <SavePanel {...props} />
      </Group>
    </>
  );
}
