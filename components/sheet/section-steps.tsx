import { Button } from "@/components/ui/button";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import { sectionKeys, type SectionKey } from "@/lib/domain/sheet/draft-sections";

type SectionStepsProps = { at: number; onGo: (section: SectionKey) => void };

/** The ways to the section before and the one after, where a thumb reaches them. */
export function SectionSteps({ at, onGo }: SectionStepsProps) {
  const [before, after] = [sectionKeys[at - 1], sectionKeys[at + 1]];
  return (
    <div className="by-hand sticky bottom-0 z-1 -mx-4 mt-6 flex flex-wrap gap-2.5 border-t-hair border-ink bg-paper px-4 pt-2.5 pb-[max(0.625rem,env(safe-area-inset-bottom))] @max-[14rem]:static @4xl:static @4xl:mx-0 @4xl:px-0 print:hidden">
      <Button
        size="desk"
        variant="quiet"
        disabled={!before}
        onClick={() => before && onGo(before)}
        className="min-h-14 flex-1"
      >
        {words.previous}
      </Button>
      {after && (
        <Button size="desk" variant="good" onClick={() => onGo(after)} className="min-h-14 flex-[2]">
          {`${words.next}: ${words.sections[after]}`}
        </Button>
      )}
    </div>
  );
}
