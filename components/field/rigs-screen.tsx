import { useEffect, useState } from "react";
import { UpdateOffer } from "@/components/settings/update-offer";
import { buttonClass } from "@/components/ui/button";
import { EmptyState } from "@/components/ui/empty-state";
import { Skeleton } from "@/components/ui/skeleton";
import { LocalNote, LocalRigsFoot } from "@/components/starter/local-note";
import { LocalRigs } from "@/components/starter/local-rigs";
import { isLocalOnly, type SyncView } from "@/lib/client/sync";
import { fieldWords } from "@/lib/domain/messages/field";
import { LAMPS } from "./address";
import { FieldFrame } from "./field-frame";
import { KeptWalks } from "./kept-walks";
import { NoRigs } from "./no-rigs";
import { RigCard } from "./rig-card";
import { useScreenTitle } from "./screen-title";
import { SyncNotes } from "./sync-notes";
import { StoreRefused } from "./walk-notes";
import { WingLink } from "./wing-link";
import { WingTop } from "./wing-top";

const words = fieldWords.rigs;

/** The rigs of this phone's member and the walks on this phone. */
export function RigsScreen({ sync }: { sync: SyncView }) {
  useScreenTitle(words.title);
  if (sync.storeRefused) return <StoreRefused />;
  return (
    <FieldFrame>
      <WingTop member={sync.bundle?.member} />
      <UpdateOffer walks={sync.walks} />
      <Rigs sync={sync} />
      <WingLink prompt={LAMPS} className={`${buttonClass("quiet")} mx-3 mt-5 md:max-w-md`}>
        {words.prompter}
      </WingLink>
    </FieldFrame>
  );
}

function Rigs({ sync }: { sync: SyncView }) {
  const { ready, bundle, local, walks } = sync;
  const localOnly = isLocalOnly(sync);
  if (!ready) return <ReadingStore />;
  if (!bundle) return <NoRigs sync={sync} />;
  return (
    <>
      {localOnly && !sync.roleRefused ? <LocalNote /> : <SyncNotes sync={sync} />}
      <div className="flex flex-col gap-y-4 lg:grid lg:grid-cols-[minmax(0,1fr)_23rem] lg:items-start lg:gap-x-8">
        <div>
          {bundle.rigs.length === 0 && (
            <EmptyState title={fieldWords.none.noRigsTitle}>{fieldWords.none.noRigs}</EmptyState>
          )}
          {bundle.rigs.map((rig) => (
            <RigCard
              key={rig.id}
              rig={rig}
              member={bundle.member}
              walks={walks}
              alone={bundle.rigs.length === 1}
            />
          ))}
          {localOnly && <LocalRigsFoot rigs={bundle.rigs.length} />}
          {local && !localOnly && <LocalRigs local={local} walks={walks} />}
        </div>
        <KeptWalks walks={walks} />
      </div>
    </>
  );
}

const SLOW_MS = 3_000;

/** While the phone's store is read for the first time; it says so when that takes long. */
function ReadingStore() {
  const [slow, setSlow] = useState(false);
  useEffect(() => {
    const timer = setTimeout(() => setSlow(true), SLOW_MS);
    return () => clearTimeout(timer);
  }, []);
  return (
    <div className="px-4">
      <Skeleton label={slow ? fieldWords.notes.storeSlow : words.reading} />
    </div>
  );
}
