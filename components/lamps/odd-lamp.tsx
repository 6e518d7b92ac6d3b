import { useState } from "react";
import { Question } from "@/components/field/question";
import { Button } from "@/components/ui/button";
import { lamps, lampStates, type Lamp } from "@/lib/domain/entry";
import type { LampPair } from "@/lib/domain/lamp-board";
import { lampBoardWords as words } from "@/lib/domain/messages/lamps";

type OddLampProps = {
  expected: LampPair;
  pair: LampPair;
  onPair: (pair: LampPair) => void;
  onSave: () => void;
  onBack: () => void;
};

/** Lamp by lamp: which one is not as drawn, and what it does. The other one counts as drawn. */
export function OddLamp({ expected, pair, onPair, onSave, onBack }: OddLampProps) {
  const [which, setWhich] = useState<Lamp | null>(null);
  const [empty, setEmpty] = useState(false);
  const changed = lamps.some((lamp) => pair[lamp] !== expected[lamp]);
  if (which) {
    return (
      <Question id="odd-what" title={words.oddWhat(which)} appearance={which}>
        <div className="acts-two">
          {lampStates.map((state) => (
            <Button
              key={state}
              aria-pressed={pair[which] === state && pair[which] !== expected[which]}
              className="aria-pressed:border-ink aria-pressed:bg-ink aria-pressed:text-paper"
              onClick={() => {
                onPair({ ...pair, [which]: state });
                setEmpty(false);
                setWhich(null);
              }}
            >
              {words.state[state]}
            </Button>
          ))}
          <Button variant="quiet" onClick={() => setWhich(null)}>
            {words.oddBack}
          </Button>
        </div>
      </Question>
    );
  }
  return (
    <Question id="odd" title={words.oddTitle} appearance="which">
      <div className="acts-two">
        {lamps.map((lamp) => (
          <Button
            key={lamp}
            className="min-h-primary"
            hint={words.oddState(pair[lamp], pair[lamp] === expected[lamp])}
            onClick={() => setWhich(lamp)}
          >
            {words.lamp[lamp]}
          </Button>
        ))}
      </div>
      {empty && (
        <p role="alert" className="px-1 font-semibold">
          {words.oddNone}
        </p>
      )}
      <div className="acts-two">
        <Button
          variant={changed ? "good" : "quiet"}
          className="min-h-primary"
          onClick={() => (changed ? onSave() : setEmpty(true))}
        >
          {words.oddSave}
        </Button>
        <Button variant="quiet" onClick={onBack}>
          {words.oddBack}
        </Button>
      </div>
    </Question>
  );
}
