import { Button } from "@/components/ui/button";
import type { Depth, Purpose } from "@/lib/domain/entry";
import type { BundleRig } from "@/lib/domain/field";
import { fieldWords } from "@/lib/domain/messages/field";
import { DepthChoice } from "./depth-choice";

const words = fieldWords.rigs;

const abreast = {
  three: "grid-cols-[repeat(auto-fit,minmax(min(100%,max(6rem,30%)),1fr))]",
  two: "grid-cols-[repeat(auto-fit,minmax(min(100%,max(7rem,40%)),1fr))]",
};

type RigStartsProps = {
  rig: BundleRig;
  purposes: readonly Purpose[];
  /** Whether the usual walk is the main thing to do; not while another is open. */
  main: boolean;
  depth: Depth;
  onDepth: (depth: Depth) => void;
  onStart: (purpose: Purpose) => void;
};

/** The walks that can be started on a rig, each in one tap. */
export function RigStarts({ rig, purposes, main, depth, onDepth, onStart }: RigStartsProps) {
  const usual = main ? purposes[0] : undefined;
  const others = purposes.filter((purpose) => purpose !== usual);
  const start = (purpose: Purpose) => (
    <>
      {words.start(purpose)} <span className="sr-only">{words.ofRig(rig.name)}</span>
    </>
  );
  return (
    <div className="flex flex-col gap-2.5">
      {usual && (
        <Button
          variant="good"
          className="text-[1.875rem]"
          hint={words.checks(rig.revision.document.walks[usual][depth].length)}
          onClick={() => onStart(usual)}
        >
          {start(usual)}
        </Button>
      )}
      <DepthChoice rig={rig} purpose={purposes[0]!} depth={depth} onDepth={onDepth} />
      {/* Threes or pairs, and fewer abreast where large text needs the room. */}
      <div className={`grid gap-2.5 ${others.length % 3 === 0 ? abreast.three : abreast.two}`}>
        {others.map((purpose) => (
          <Button key={purpose} variant="quiet" onClick={() => onStart(purpose)}>
            {start(purpose)}
          </Button>
        ))}
      </div>
    </div>
  );
}
