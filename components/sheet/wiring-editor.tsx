import { useFieldArray } from "react-hook-form";
import { Button } from "@/components/ui/button";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import { blankRow } from "@/lib/domain/sheet/draft";
import { parts } from "@/lib/domain/sheet/draft-sections";
import type { ListOutline } from "@/lib/domain/sheet/outline";
import { segmentFields } from "@/lib/domain/sheet/wiring";
import { useDraftDesk } from "./draft-context";
import { Group } from "./part-fields";
import { RowList, Where } from "./row-list";
import { SegmentCard } from "./segment-card";

const [socket, segmentList, grounds] = parts.wiring.lists as [ListOutline, ListOutline, ListOutline];

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
      <Group title={socket.title} lead={words.socketLead}>
        <RowList
          name="wiring.socket"
          list={socket}
          most={13}
          add={words.contactAdd}
          fill={count ? { label: words.socketFill(count), rows: numbered } : undefined}
        />
      </Group>
      <Group title={segmentList.title} lead={words.segmentsLead}>
        <Where words={segmentList.words} />
        <div className="mt-3 flex flex-col gap-4">
          {segments.map((segment, at) => (
            <SegmentCard
              list={segmentList}
              key={`${segment.id} ${at}`}
              at={at}
              of={segments.length}
              onMove={(by) => swap(at, at + by)}
              onRemove={() => remove(at)}
            />
          ))}
        </div>
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
      <Group title={grounds.title} lead={words.groundsLead}>
        <RowList name="wiring.grounds" list={grounds} most={12} add={words.groundAdd} />
      </Group>
    </>
  );
}
