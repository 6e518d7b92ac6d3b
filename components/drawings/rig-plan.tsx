import { rigPlanWords } from "@/lib/domain/messages/drawings";
import type { StationKey } from "@/lib/domain/revision";

const you: Record<StationKey, readonly [x: number, y: number]> = {
  "coach-tail": [66, 24],
  "car-nose": [88, 25],
  "cables-and-cord": [77, 16],
  "car-cabin": [102, 20],
  pull: [11, 21],
  "car-tail": [125, 16],
  "last-look": [66, 25],
};

/** A small top view of the rig, coach to the left, with a dot where you stand. */
export function RigPlan({ station }: { station: StationKey }) {
  const [x, y] = you[station];
  return (
    <svg
      viewBox="0 0 134 32"
      role="img"
      aria-label={rigPlanWords[station]}
      className="block h-8 w-33.5 shrink-0"
    >
      {station === "last-look" && (
        <path d="M4 2H126Q132 2 132 8V24Q132 30 126 30H4" strokeDasharray="3 3" className="dr-fine dr-open" />
      )}
      <path d="M5 7H61Q64 7 64 10V22Q64 25 61 25H5Q2 25 2 22V10Q2 7 5 7Z" className="dr-part" />
      <path d="M12 8V24" className="dr-fine" />
      <path d="M64 16H74L87 10M74 16L87 22" className="dr-fine dr-open" />
      <path d="M90 8H119Q126 9 126 16T119 24H90Q86 16 90 8Z" className="dr-part" />
      <path d="M97 10Q94 16 97 22M115 10Q118 16 115 22" className="dr-fine dr-open" />
      <circle cx={x} cy={y} r="5.5" className="dr-part dr-now" />
    </svg>
  );
}
