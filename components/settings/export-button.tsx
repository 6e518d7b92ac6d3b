import { useState } from "react";
import { Button } from "@/components/ui/button";
import { handOver, type ExportFile, type HandedOver } from "@/lib/client/record-export";
import { exportWords } from "@/lib/domain/messages/settings";

type State = { kind: "idle" | "busy" | "nothing" | "failed" } | { kind: HandedOver; name: string };

type ExportButtonProps = {
  /** Makes the file; null where there is nothing to write. */
  file: () => Promise<ExportFile | null>;
  label?: string;
  hint?: string;
};

/** Writes a record to a file and hands it to the person; says what came of it. */
export function ExportButton({ file, label = exportWords.one, hint }: ExportButtonProps) {
  const [state, setState] = useState<State>({ kind: "idle" });
  const write = async () => {
    if (state.kind === "busy") return;
    setState({ kind: "busy" });
    try {
      const made = await file();
      setState(made ? { kind: await handOver(made), name: made.name } : { kind: "nothing" });
    } catch {
      setState({ kind: "failed" });
    }
  };
  const said = sayings(state);
  return (
    <div className="flex flex-col items-start gap-1.5">
      <Button variant="plain" className="w-full max-w-96 px-6" hint={hint} onClick={() => void write()}>
        {label}
      </Button>
      <p role="status" className="text-base wrap-anywhere empty:hidden">
        {said}
      </p>
    </div>
  );
}

function sayings(state: State): string {
  if (state.kind === "busy") return exportWords.busy;
  if (state.kind === "nothing") return exportWords.nothing;
  if (state.kind === "failed") return exportWords.failed;
  if (state.kind === "downloaded") return exportWords.downloaded(state.name);
  return state.kind === "shared" ? exportWords.shared : "";
}
