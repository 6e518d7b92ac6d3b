import type { KeptWalk } from "@/lib/client/walk-shelf";
import { fieldWords } from "@/lib/domain/messages/field";
import { recentText } from "@/lib/client/time-words";
import { photoCounts } from "@/lib/client/photo-delivery";
import { localWords } from "@/lib/domain/messages/account";
import { photoWords } from "@/lib/domain/messages/photo";
import { useSyncView } from "./browser-field";
import { SIGN_IN, SIGN_UP } from "./no-rigs";
import { useNowMs } from "./now";

const words = fieldWords.result;

type CustodyProps = { walk: KeptWalk; signedOut: boolean };

/** Where a signed record is: on this phone, and with the server once its receipt was verified. */
export function Custody({ walk, signedOut }: CustodyProps) {
  return (
    <section
      aria-label={words.custody}
      className="grid grid-cols-[1.75rem_minmax(0,1fr)] items-center gap-x-3 gap-y-0.5"
    >
      <Segment lit />
      <p className="leading-tight font-extrabold">{words.saved}</p>
      <Segment lit={walk.receipt !== null} />
      <div role="status" className="min-h-[2.2em] content-center leading-tight">
        <Onward walk={walk} signedOut={signedOut} />
      </div>
    </section>
  );
}

function Onward({ walk, signedOut }: CustodyProps) {
  const nowMs = useNowMs();
  const { local, photos } = useSyncView();
  const madeWithoutAccount = local?.member.id === walk.member;
  if (walk.receipt) {
    const when = recentText(walk.receipt.receivedAt, nowMs);
    const { kept } = photoCounts(photos.filter((photo) => photo.walk === walk.id));
    return (
      <>
        <p className="leading-tight font-extrabold">{words.received(when)}</p>
        {kept > 0 && <p className="text-base text-soft">{photoWords.waiting(kept)}</p>}
      </>
    );
  }
  if (walk.refused) {
    return (
      <p className="text-base">
        <strong>{words.refusedTitle}.</strong> {words.refused(walk.refused)}
      </p>
    );
  }
  if (madeWithoutAccount) {
    return (
      <p className="text-base text-soft">
        <a href={SIGN_UP} className="inline-block py-2 underline">
          {localWords.signUpFirst}
        </a>
      </p>
    );
  }
  if (!signedOut) return <p className="text-base text-soft">{words.byItself}</p>;
  return (
    <p className="text-base text-soft">
      <a href={SIGN_IN} className="inline-block py-2 underline">
        {words.signInFirst}
      </a>
    </p>
  );
}

/** Two segments, one above the other, each filled when the record is there; an outline alone would look unticked. */
function Segment({ lit }: { lit: boolean }) {
  return (
    <span
      aria-hidden="true"
      className={`block h-full min-h-8 border-2 forced-color-adjust-none ${lit ? "border-ink bg-ink" : "unlit border-soft"}`}
    />
  );
}
