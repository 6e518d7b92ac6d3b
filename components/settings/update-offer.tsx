import { useEffect, useState } from "react";
import { takeVersion, useWaitingVersion } from "@/components/field/register-worker";
import { Button } from "@/components/ui/button";
import { mayOffer, offerFacts } from "@/lib/client/update-offer";
import type { KeptWalk } from "@/lib/client/walk-shelf";
import { updateWords } from "@/lib/domain/messages/settings";

const ASK_AGAIN_MS = 5_000;

/** A quiet line where a new version waits and no walk is open on this phone, in any tab. Nothing happens unasked. */
export function UpdateOffer({ walks }: { walks: readonly KeptWalk[] }) {
  const waiting = useWaitingVersion();
  const offered = useOffered(waiting, walks);
  const [state, setState] = useState<"offered" | "taking" | "not-now">("offered");
  if (!offered) return null;

  const take = async () => {
    if (state === "taking") return;
    setState("taking");
    // Asked again at the tap: a walk may have been opened in another tab since.
    const free = mayOffer(await offerFacts(waiting, walks));
    if (free) takeVersion();
    else setState("not-now");
  };
  return (
    <section
      aria-label={updateWords.title}
      className="mx-4 mb-3 flex flex-wrap items-center justify-between gap-x-4 gap-y-2 border-l-8 border-edge bg-shade py-2 pr-2 pl-3"
    >
      <div className="min-w-0 flex-[1_1_12rem]">
        <p className="font-extrabold">{updateWords.title}</p>
        <p role="status" className="text-base text-soft">
          {state === "not-now" ? updateWords.notNow : updateWords.text}
        </p>
      </div>
      <Button variant="plain" className="bg-paper px-5" onClick={() => void take()}>
        {state === "taking" ? updateWords.taking : updateWords.take}
      </Button>
    </section>
  );
}

/** Whether it may be offered now; asked again while not, since a tab that lets go of a walk tells nobody. */
function useOffered(waiting: boolean, walks: readonly KeptWalk[]): boolean {
  const [offered, setOffered] = useState(false);
  useEffect(() => {
    if (!waiting) return;
    let current = true;
    const ask = () =>
      void offerFacts(waiting, walks).then(
        (facts) => current && setOffered(mayOffer(facts)),
        () => {},
      );
    ask();
    const timer = setInterval(ask, ASK_AGAIN_MS);
    return () => {
      current = false;
      clearInterval(timer);
    };
  }, [waiting, walks]);
  return waiting && offered;
}
