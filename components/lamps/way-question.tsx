import { Question } from "@/components/field/question";
import { Button } from "@/components/ui/button";
import { lampBoardWords as words } from "@/lib/domain/messages/lamps";
import type { Way } from "./way";

const ways: readonly Way[] = ["clock", "arms", "clip", "plain"];

/** How the signals are given. */
export function WayQuestion({ onWay }: { onWay: (way: Way) => void }) {
  return (
    <Question id="how" title={words.howTitle}>
      <div className="acts-two">
        {ways.map((way) => (
          <Button key={way} className="min-h-primary" onClick={() => onWay(way)}>
            {words.ways[way]}
          </Button>
        ))}
      </div>
    </Question>
  );
}
