import { useSyncExternalStore } from "react";
import { Button } from "@/components/ui/button";
import { canSound, canVibrate, feel } from "@/lib/client/feel";
import { canMeasureLight } from "@/lib/client/light";
import { choose } from "@/lib/client/preference-store";
import { settingsWords } from "@/lib/domain/messages/settings";
import { Choice } from "./choice";
import { SettingsSection } from "./settings-section";
import { usePreferences } from "./use-preferences";

const never = () => () => {};

/** What this browser has, once the page runs in one; prerendered as if it had all but a light sensor. */
function useHas(has: () => boolean, prerendered: boolean): boolean {
  return useSyncExternalStore(never, has, () => prerendered);
}

/** Every choice a person has; what the phone cannot do is said instead of offered. */
export function PreferenceChoices() {
  const { look, text, hand, sound, vibration, units } = usePreferences();
  const measures = useHas(canMeasureLight, false);
  const sounds = useHas(canSound, true);
  const vibrates = useHas(canVibrate, true);
  const { light, ...looks } = settingsWords.look.choices;
  return (
    <>
      <Choice
        title={settingsWords.look.title}
        options={measures || look === "light" ? { ...looks, light } : looks}
        value={look}
        onChoose={(value) => choose("look", value)}
      />
      <Choice
        title={settingsWords.text.title}
        options={settingsWords.text.choices}
        value={text}
        onChoose={(value) => choose("text", value)}
      />
      <Choice
        title={settingsWords.hand.title}
        lead={settingsWords.hand.lead}
        options={settingsWords.hand.choices}
        value={hand}
        onChoose={(value) => choose("hand", value)}
      />
      {sounds ? (
        <Choice
          title={settingsWords.sound.title}
          lead={settingsWords.sound.lead}
          options={settingsWords.sound.choices}
          value={sound}
          onChoose={(value) => choose("sound", value)}
        />
      ) : (
        <Without title={settingsWords.sound.title}>{settingsWords.sound.none}</Without>
      )}
      {vibrates ? (
        <Choice
          title={settingsWords.vibration.title}
          options={settingsWords.vibration.choices}
          value={vibration}
          onChoose={(value) => choose("vibration", value)}
        />
      ) : (
        <Without title={settingsWords.vibration.title}>{settingsWords.vibration.none}</Without>
      )}
      {(sounds || vibrates) && (
        <Button variant="quiet" className="-mt-3 max-w-96 px-6" onClick={() => feel("fault")}>
          {settingsWords.sound.try}
        </Button>
      )}
      <Choice
        title={settingsWords.units.title}
        options={settingsWords.units.choices}
        value={units}
        onChoose={(value) => choose("units", value)}
      />
    </>
  );
}

function Without({ title, children }: { title: string; children: string }) {
  return (
    <SettingsSection title={title}>
      <p className="text-base text-soft">{children}</p>
    </SettingsSection>
  );
}
