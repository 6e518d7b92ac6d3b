import type { ChangeEvent } from "react";
import { Button, buttonClass } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { lampScriptWords } from "@/lib/domain/messages/lamp-script";

const words = lampScriptWords.clip;

type ClipChooserProps = { unreadable: boolean; onFile: (file: File) => void; onBack: () => void };

/** Films a clip with this phone or takes one that it has. */
export function ClipChooser({ unreadable, onFile, onBack }: ClipChooserProps) {
  const take = (event: ChangeEvent<HTMLInputElement>) => {
    const [file] = event.target.files ?? [];
    // The same file may be chosen again.
    event.target.value = "";
    if (file) onFile(file);
  };
  return (
    <section className="flex max-w-3xl flex-col gap-3 px-3 pb-4">
      <h2 className="px-1 pt-3 text-2xl leading-tight font-extrabold">{words.title}</h2>
      <p className="px-1">{words.lead}</p>
      <p className="px-1 text-soft">{words.kept}</p>
      {unreadable && (
        <Notice live tone="plain">
          {words.unreadable}
        </Notice>
      )}
      <FileButton look="good" label={words.film} capture="environment" onChange={take} />
      <FileButton look="plain" label={words.choose} onChange={take} />
      <Button variant="quiet" onClick={onBack}>
        {words.back}
      </Button>
    </section>
  );
}

type FileButtonProps = {
  look: "good" | "plain";
  label: string;
  capture?: "environment";
  onChange: (event: ChangeEvent<HTMLInputElement>) => void;
};

function FileButton({ look, label, ...input }: FileButtonProps) {
  return (
    <label
      className={`${buttonClass(look)} cursor-pointer has-focus-visible:outline-4 has-focus-visible:outline-offset-2 has-focus-visible:outline-now`}
    >
      {label}
      <input type="file" accept="video/*" className="sr-only" {...input} />
    </label>
  );
}
