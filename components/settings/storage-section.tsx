import { useEffect, useState } from "react";
import { theField } from "@/components/field/browser-field";
import { Button } from "@/components/ui/button";
import { askToKeep, keepingState, type Keeping } from "@/lib/client/persistence";
import { exportAll } from "@/lib/client/record-export";
import type { SyncView } from "@/lib/client/sync";
import { bytesText, settingsWords } from "@/lib/domain/messages/settings";
import { ExportButton } from "./export-button";
import { SettingsSection } from "./settings-section";

const words = settingsWords.storage;

/** What is on this phone, whether the browser keeps it, and the way to take it all away as a file. */
export function StorageSection({ sync }: { sync: SyncView }) {
  const [keeping, setKeeping] = useState<Keeping | null>(null);
  const [asked, setAsked] = useState<"not" | "asking" | "declined">("not");
  useEffect(() => {
    let current = true;
    void keepingState().then((state) => current && setKeeping(state));
    return () => {
      current = false;
    };
  }, [sync.walks]);

  const ask = async () => {
    if (asked === "asking") return;
    setAsked("asking");
    setAsked((await askToKeep()) ? "not" : "declined");
    setKeeping(await keepingState());
  };
  const unreceived = sync.walks.filter((walk) => walk.receipt === null).length;
  return (
    <SettingsSection title={words.title}>
      <p>{words.walks(sync.walks.length, unreceived)}</p>
      <div role="status" className="min-h-[2.8em] text-base text-soft">
        {keeping && <p>{asked === "declined" ? words.declined : promiseWords(keeping)}</p>}
        {keeping && keeping.usedBytes !== null && <p>{roomWords(keeping.usedBytes, keeping.roomBytes)}</p>}
      </div>
      {keeping?.promised === false && (
        <Button variant="plain" className="max-w-96 px-6" onClick={() => void ask()}>
          {asked === "asking" ? words.asking : words.ask}
        </Button>
      )}
      <ExportButton
        label={words.exportAll}
        hint={words.exportHint}
        file={() => exportAll(theField().sync.shelf, Date.now())}
      />
    </SettingsSection>
  );
}

function promiseWords({ promised }: Keeping): string {
  if (promised === null) return words.unknown;
  return promised ? words.promised : words.notPromised;
}

function roomWords(usedBytes: number, roomBytes: number | null): string {
  const free = roomBytes === null ? null : bytesText(Math.max(0, roomBytes - usedBytes));
  return words.used(bytesText(usedBytes), free);
}
