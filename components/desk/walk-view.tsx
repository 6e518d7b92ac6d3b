import Link from "next/link";
import { clockText, durationText } from "@/lib/client/time-words";
import { bodyOf } from "@/lib/domain/entry";
import type { WalkReading } from "@/lib/domain/history";
import { deskWords, walkWords } from "@/lib/domain/messages/desk";
import { revisionsWords } from "@/lib/domain/messages/rigs";
import { photosByCheck } from "@/lib/domain/photo";
import { clockRemark, readWalk } from "@/lib/domain/walk-reading";
import { DeskHeading } from "./desk-heading";
import { SealBlock } from "./seal-block";
import { StationList } from "./station-list";
import { TimeBars } from "./time-bars";
import { TitleBlock } from "./title-block";
import { ToHistory } from "./to-history";
import { WalkPhotos } from "./walk-photos";
import { WalkRemarks } from "./walk-remarks";
import { WalkVerdict } from "./walk-verdict";

/** One walk read back: what it came to, what was seen at each station, and what holds the record together. */
export function WalkView({ reading }: { reading: WalkReading }) {
  const entries = reading.entries.map(({ entry }) => entry);
  const read = readWalk(reading.document, entries);
  const shown = new Set(read.stations.flatMap(({ checks }) => checks.map(({ check }) => check.key)));
  const photos = photosByCheck(reading.photos, shown);
  // A card that was filled in by hand keeps no time.
  const paper = entries[0] && bodyOf(entries[0], "open")?.source === "paper";
  const title = walkWords.title(reading.walk.purpose, reading.names.rig);
  return (
    <>
      <title>{`${title} · ${deskWords.brand}`}</title>
      <DeskHeading over={<ToHistory />} title={title} />
      <TitleBlock reading={reading} />
      <Link
        href={`/desk/rig?id=${reading.walk.rig}&revision=${reading.walk.revision}`}
        prefetch={false}
        className="inline-flex min-h-11 items-center text-base font-semibold underline decoration-1 underline-offset-4 print:hidden"
      >
        {revisionsWords.asItWas}
      </Link>
      <WalkVerdict
        reading={reading}
        read={read}
        took={paper ? walkWords.untimed : durationText(reading.elapsedMs)}
      />
      <div className="mt-8 grid gap-x-10 gap-y-10 grid-cols-1 @4xl:grid-cols-[minmax(0,1fr)_23rem]">
        <div className="min-w-0">
          <StationList stations={read.stations} photos={photos} />
          <WalkRemarks remarks={read.remarks} />
          <WalkPhotos photos={photos.get(null) ?? []} />
        </div>
        <div className="flex min-w-0 flex-col gap-8">
          {!paper && <TimeBars stations={read.stations} total={clockText(reading.elapsedMs)} />}
          <SealBlock reading={reading} clock={clockRemark(reading.entries)} />
        </div>
      </div>
    </>
  );
}
