import type { Recorder } from "@/lib/client/recorder";
import type { Check } from "@/lib/domain/revision";
import { BecauseQuestion } from "./because-question";
import type { Callouts } from "./callouts";
import { FaultDetails } from "./fault-details";
import type { Marking } from "./marking";
import { MeasureQuestion } from "./measure-question";

type CheckQuestionProps = {
  recorder: Recorder;
  check: Check;
  callouts: Callouts;
  marking: Marking;
  /** Where mending is shown by looking again and not by words alone. */
  onMended?: () => void;
};

/** What is asked in place of the buttons, while something is. */
export function CheckQuestion({ recorder, check, callouts, marking, onMended }: CheckQuestionProps) {
  switch (marking.asking) {
    case "why":
    case "what":
      return <BecauseQuestion marking={marking} />;
    case "details":
      return (
        <FaultDetails
          recorder={recorder}
          check={check}
          callouts={callouts}
          marking={marking}
          onMended={onMended}
        />
      );
    case "measure":
      return check.measure ? <MeasureQuestion measure={check.measure} marking={marking} /> : null;
    case null:
      return null;
  }
}
