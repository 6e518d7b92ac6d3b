import { useState } from "react";
import { usePreferences } from "@/components/settings/use-preferences";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import {
  quantityOf,
  shownIn,
  unitsFor,
  type QuantityKind,
  type QuantityOf,
} from "@/lib/domain/sheet/quantity";
import type { InputProps } from "./field-line";
import { inputLook, NotKnown } from "./not-known";

type QuantityInputProps = InputProps & { kind: QuantityKind };

type Entered = { entered: { value: number; unit: string } };

/** A figure with its unit: kept as it was entered, and said in a person's own units where it was entered in others. */
export function QuantityInput({
  id,
  label,
  value,
  onChange,
  describedBy,
  invalid,
  kind,
}: QuantityInputProps) {
  const { units: system } = usePreferences();
  const entered = isQuantity(value) ? value.entered : null;
  const [chosen, setChosen] = useState<string | null>(null);
  // What is being typed: “12.” reads as 12, and must not lose its point meanwhile.
  const [typing, setTyping] = useState<string | null>(null);
  const unit = entered?.unit ?? chosen ?? unitsFor(kind, system)[0]!;
  const notKnown = value === null;
  const text = entered ? String(entered.value) : notKnown ? "" : String(value);
  const type = (next: string, inUnit: string) => {
    setTyping(next);
    onChange(readQuantity(kind, next, inUnit));
  };
  const own = entered && shownIn(kind, value as QuantityOf<QuantityKind>, system);
  return (
    <>
      <NotKnown label={label} value={value} onChange={onChange}>
        <input
          id={id}
          type="text"
          inputMode="decimal"
          autoComplete="off"
          value={notKnown ? "" : (typing ?? text)}
          disabled={notKnown}
          placeholder={notKnown ? words.notKnown : undefined}
          aria-invalid={invalid || undefined}
          aria-describedby={describedBy}
          onChange={({ target }) => type(target.value, unit)}
          onBlur={() => setTyping(null)}
          className={`tabular ${inputLook(invalid)}`}
        />
        <select
          aria-label={words.unitAloud(label)}
          value={unit}
          disabled={notKnown}
          onChange={({ target }) => {
            setChosen(target.value);
            if (text) onChange(readQuantity(kind, text, target.value));
          }}
          className="tabular min-h-13 shrink-0 rounded-[3px] border-2 border-edge bg-paper px-2 text-base"
        >
          {unitsFor(kind, system).map((each) => (
            <option key={each}>{each}</option>
          ))}
        </select>
      </NotKnown>
      {own && own.unit !== unit && (
        <p className="tabular mt-1 text-base text-soft">
          {words.same(`${own.value.toLocaleString("en-US")} ${own.unit}`)}
        </p>
      )}
    </>
  );
}

function isQuantity(value: unknown): value is Entered {
  return typeof value === "object" && value !== null && "entered" in value;
}

/** The quantity that a text says, the text itself where it says none. Commas may part the thousands. */
function readQuantity(kind: QuantityKind, text: string, unit: string): unknown {
  const plain = text.trim();
  const digits = /^-?\d{1,3}(,\d{3})+(\.\d*)?$/.test(plain) ? plain.replaceAll(",", "") : plain;
  if (!/^-?(\d{1,12}\.?\d{0,6}|\.\d{1,6})$/.test(digits)) return plain;
  return quantityOf(kind, Number(digits), unit) ?? plain;
}
