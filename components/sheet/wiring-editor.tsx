import { useFieldArray } from "react-hook-form";
import { Button } from "@/components/ui/button";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import { blankRow } from "@/lib/domain/sheet/draft";
import { wiringLists } from "@/lib/domain/sheet/draft-sections";
import { segmentFields } from "@/lib/domain/sheet/wiring";
import { useDraftDesk } from "./draft-context";
import { Group } from "./part-fields";
import { RowList, Where } from "./row-list";
import { SegmentCard } from "./segment-card";

// How many contacts each socket has.
const contacts: Record<string, number> = { "4-flat": 4, "5-flat": 5, "6-round": 6, "7-blade": 7 };

/** What was measured at the socket, the runs from coach to lamps in order, and what hangs on each ground point. */
export function WiringEditor() {
  const { sheet } = useDraftDesk();
  const { fields: segments, append, remove, swap } = useFieldArray({ name: "wiring.segments" });
  const count = contacts[sheet.coach?.socketType ?? ""];
  const numbered = Array.from({ length: count ?? 0 }, (_, at) => ({ contact: String(at + 1) }));
  return (
    <>
      <Group title={words.socketTitle} lead={words.socketLead}>
        <RowList
          name="wiring.socket"
          {...wiringLists.socket}
          most={13}
          called={words.contact}
          add={words.contactAdd}
          fill={count ? { label: words.socketFill(count), rows: numbered } : undefined}
        />
      </Group>
      <Group title={words.segmentsTitle} lead={words.segmentsLead}>
        <Where words={wiringLists.segments.words} />
        <ol className="mt-3 flex flex-col gap-4">
          {segments.map((segment, at) => (
            <SegmentCard
              key={`${segment.id} ${at}`}
              at={at}
              of={segments.length}
              onMove={(by) => swap(at, at + by)}
              onRemove={() => remove(at)}
            />
          ))}
        </ol>
        {segments.length < 24 && (
          <Button
            size="desk"
            className="mt-3 min-h-13"
            onClick={() =>
              append({
                ...blankRow(segmentFields),
                from: sheet.wiring?.segments?.at(-1)?.to ?? "",
                conductors: [],
                splices: [],
              })
            }
          >
            {words.segmentAdd}
          </Button>
        )}
      </Group>
      <Group title={words.groundsTitle} lead={words.groundsLead}>
        <RowList
          name="wiring.grounds"
          {...wiringLists.grounds}
          most={12}
          called={words.ground}
          add={words.groundAdd}
        />
      </Group>
    </>
  );
}
