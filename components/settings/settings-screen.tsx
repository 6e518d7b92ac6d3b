import { useRef } from "react";
import { FieldFrame } from "@/components/field/field-frame";
import { useWaitingVersion } from "@/components/field/register-worker";
import { useReturn, useScreenTitle } from "@/components/field/screen-title";
import { WingLink } from "@/components/field/wing-link";
import type { SyncView } from "@/lib/client/sync";
import { settingsWords } from "@/lib/domain/messages/settings";
import { APP } from "@/lib/domain/version";
import { InstallSection } from "./install-section";
import { LookSample } from "./look-sample";
import { PreferenceChoices } from "./preference-choices";
import { SettingsSection } from "./settings-section";
import { StorageSection } from "./storage-section";

/** The settings of this browser, and what is to be known of it: its storage, installing, the version. */
export function SettingsScreen({ sync }: { sync: SyncView }) {
  const heading = useRef<HTMLHeadingElement>(null);
  useScreenTitle(settingsWords.title);
  useReturn(heading);
  return (
    <FieldFrame>
      <header className="flex flex-wrap items-center justify-between gap-x-4 pt-2 pr-1 pb-1 pl-4">
        <div className="min-w-0 flex-[1_1_9rem] py-1">
          <h1
            ref={heading}
            tabIndex={-1}
            className="text-[1.375rem] leading-[1.1] font-extrabold outline-none"
          >
            {settingsWords.title}
          </h1>
          <p className="text-base text-soft">{settingsWords.lead}</p>
        </div>
        <WingLink className="flex min-h-field items-center px-3 underline">{settingsWords.back}</WingLink>
      </header>
      <div className="lg:grid lg:grid-cols-[minmax(0,1fr)_26rem] lg:items-start lg:gap-x-8">
        <div className="lg:sticky lg:top-4 lg:order-2">
          <LookSample />
        </div>
        <div className="flex flex-col gap-y-7 px-4 pt-5 lg:pt-0">
          <PreferenceChoices />
          <StorageSection sync={sync} />
          <InstallSection />
          <Version />
        </div>
      </div>
    </FieldFrame>
  );
}

function Version() {
  const waiting = useWaitingVersion();
  const words = settingsWords.version;
  return (
    <SettingsSection title={words.title}>
      <p className="tabular">{words.now(APP)}</p>
      <p className="text-base text-soft">{waiting ? words.waiting : words.current}</p>
    </SettingsSection>
  );
}
