import { depths, type Depth, type Purpose } from "@/lib/domain/entry";
import type { BundleRig } from "@/lib/domain/field";
import { walkingWords } from "@/lib/domain/messages/walking";

const words = walkingWords.depth;

type DepthChoiceProps = {
  rig: BundleRig;
  purpose: Purpose;
  depth: Depth;
  onDepth: (depth: Depth) => void;
};

/** How far to walk: the whole list, or its holds only for someone practised; nothing where the two are the same. */
export function DepthChoice({ rig, purpose, depth, onDepth }: DepthChoiceProps) {
  const walks = rig.revision.document.walks[purpose];
  if (walks.full.length === walks.short.length) return null;
  return (
    <fieldset className="flex">
      <legend className="sr-only">{words.legend}</legend>
      {depths.map((each) => (
        <label
          key={each}
          className="flex min-h-field flex-1 items-center justify-center border-2 border-edge px-2 text-center text-[1.0625rem] leading-tight font-semibold first-of-type:rounded-l-[3px] last-of-type:-ml-0.5 last-of-type:rounded-r-[3px] has-checked:border-ink has-checked:bg-ink has-checked:text-paper has-focus-visible:outline-4 has-focus-visible:outline-offset-2 has-focus-visible:outline-now"
        >
          <input
            type="radio"
            name={`depth-${rig.id}`}
            className="sr-only"
            checked={depth === each}
            onChange={() => onDepth(each)}
          />
          {words[each](walks[each].length)}
        </label>
      ))}
    </fieldset>
  );
}
