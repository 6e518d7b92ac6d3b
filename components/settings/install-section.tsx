import { InstallAdvice, InstallFirst, useInstallSituation } from "@/components/session/install-note";
import { installWords } from "@/lib/domain/messages/settings";
import { SettingsSection } from "./settings-section";

/** What installing means here; one line in the installed app. */
export function InstallSection() {
  const situation = useInstallSituation();
  if (situation === "own-store") return <InstallFirst title={installWords.titleSettings} />;
  return (
    <SettingsSection title={installWords.titleSettings}>
      {situation === "installed" ? (
        <p>{installWords.done}</p>
      ) : (
        <InstallAdvice offered={situation === "offered"} />
      )}
    </SettingsSection>
  );
}
