import { Button } from "@/components/ui/button";
import { lampBoardWords as words } from "@/lib/domain/messages/lamps";
import type { Check } from "@/lib/domain/revision";
import type { Board } from "./board";
import { ScriptBar } from "./script-bar";
import { SignalButtons } from "./signal-buttons";
import type { useWay } from "./way";

type SignalActsProps = {
  check: Check;
  board: Board;
  first: boolean;
  way: ReturnType<typeof useWay>;
  onOdd: () => void;
};

/** The answers to a signal, under the script where one gives the signals. */
export function SignalActs({ check, board, first, way, onOdd }: SignalActsProps) {
  const { phase } = way.script.state;
  const scripted = way.way === "clock";
  const bar = (
    <ScriptBar
      state={way.script.state}
      onStart={way.script.start}
      onStop={way.script.stop}
      hold={way.hold}
      onHold={way.setHold}
    />
  );
  const another = (
    <Button variant="quiet" onClick={() => board.show("how")}>
      {words.how}
    </Button>
  );
  // Before the script gives a signal there is nothing to answer.
  if (scripted && (phase === "idle" || phase === "waiting")) {
    return (
      <div className="flex flex-col gap-2.5">
        {phase === "idle" && <p className="px-1 text-base">{words.clockHow}</p>}
        {bar}
        {phase === "idle" && another}
      </div>
    );
  }
  return (
    <div className="flex flex-col gap-2.5">
      {scripted && bar}
      <SignalButtons check={check} board={board} first={first} onOdd={onOdd} />
      {!scripted && board.place === 1 && another}
    </div>
  );
}
