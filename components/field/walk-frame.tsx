import type { ReactNode } from "react";

type WalkFrameProps = {
  head: ReactNode;
  strip: ReactNode;
  /** The line that says where one stands; above the picture. */
  where?: ReactNode;
  /** What is looked at: it takes the room that the words and buttons leave. */
  picture: ReactNode;
  words: ReactNode;
  /** In thumb reach, at the bottom. */
  acts: ReactNode;
};

/**
 * One step of a walk: in one column on a phone, the picture beside the words where there is room. It fills the screen
 * and no more, as long as the words fit; with larger text the page scrolls instead.
 */
export function WalkFrame({ head, strip, where, picture, words, acts }: WalkFrameProps) {
  return (
    <main className="flex min-h-dvh flex-col md:grid md:grid-cols-[minmax(0,7fr)_minmax(21rem,5fr)] md:grid-rows-[auto_auto_minmax(0,1fr)_auto] md:gap-x-4">
      <div className="md:col-start-2 md:row-start-1">{head}</div>
      <div className="px-4 md:col-start-2 md:row-start-2 md:pb-2">{strip}</div>
      <div className="md:col-start-1 md:row-start-1 md:self-end">{where}</div>
      <div className="flex flex-1 flex-col border-y-hair border-rule md:col-start-1 md:row-span-3 md:row-start-2 md:border-r-hair md:border-b-0">
        {picture}
      </div>
      <div className="md:col-start-2 md:row-start-3">{words}</div>
      <div className="px-3 pt-3 pb-[max(1rem,env(safe-area-inset-bottom))] md:col-start-2 md:row-start-4">
        {acts}
      </div>
    </main>
  );
}
