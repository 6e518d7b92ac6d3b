import { expect, type Locator, type Page } from "@playwright/test";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import { optionWords } from "@/lib/domain/messages/sheet-wiring";
import {
  partIn,
  parts,
  partShows,
  sectionKeys,
  sectionParts,
  type SectionKey,
} from "@/lib/domain/sheet/draft-sections";
import type { Field } from "@/lib/domain/sheet/field";
import type { ListOutline } from "@/lib/domain/sheet/outline";
import type { Sheet } from "@/lib/domain/sheet/sheet";

type Values = Record<string, unknown>;

/** Goes to a section of the form by its contents, as a person does. */
export async function goToSection(page: Page, section: SectionKey): Promise<void> {
  const title = words.sections[section];
  const heading = page.getByRole("heading", { level: 2, name: title, exact: true });
  await page.getByRole("heading", { level: 2 }).first().waitFor();
  if (await heading.isVisible()) return;
  const fold = page.locator("form > details").first();
  const contents = page.getByRole("navigation", { name: words.contents }).filter({ visible: true });
  // The contents fold up by themselves as a section opens, which may be just now.
  await expect(async () => {
    if ((await fold.isVisible()) && !(await fold.evaluate((each) => (each as HTMLDetailsElement).open)))
      await fold.locator("summary").click({ timeout: 1_000 });
    const button = contents.getByRole("button", { name: new RegExp(`^${escaped(title)}`) });
    await button.click({ timeout: 1_000 });
    await expect(heading).toBeVisible({ timeout: 2_000 });
  }).toPass();
}

/**
 * Types a whole sheet into the form that is open, section by section and by what each field is called. Everything that
 * the sheet has is entered but ids, which the form makes, and photographs, which are taken.
 */
export async function fillSheet(page: Page, sheet: Sheet): Promise<void> {
  for (const section of sectionKeys) await fillSection(page, sheet, section);
}

/** Types what a sheet has in one section. */
export async function fillSection(page: Page, sheet: Sheet, section: SectionKey): Promise<void> {
  if (section === "look") return;
  await goToSection(page, section);
  const body = page.locator("form");
  if (section === "rig") {
    await fillField(body, words.name.label, { kind: "text", most: 60 }, sheet.name);
    await fillField(body, words.notes.label, { kind: "text", most: 1000 }, sheet.notes);
    return;
  }
  for (const key of sectionParts[section]) {
    const part = parts[key];
    const values = partIn(sheet, part);
    if (!values || !partShows(sheet, key)) continue;
    const group = page.getByRole("group", { name: part.title, exact: true });
    for (const field of [...part.first, ...Object.keys(part.fields)]) {
      if (values[field] === undefined) continue;
      await openFold(group);
      await fillField(group, part.words[field]!.label, part.fields[field]!, values[field]);
    }
    for (const list of part.lists) {
      await fillList(page.getByRole("group", { name: list.title, exact: true }), list, values[list.key]);
    }
  }
}

async function fillList(group: Locator, list: ListOutline, items: unknown): Promise<void> {
  for (const [at, item] of ((items ?? []) as Values[]).entries()) {
    await group.getByRole("button", { name: adders[list.key]!, exact: true }).last().click();
    const row = group.getByRole("group", { name: list.item(at + 1), exact: true });
    await expect(row).toBeVisible();
    for (const [key, field] of Object.entries(list.fields)) {
      // The near end goes first: where the far one differs, the tag is asked for.
      await fillField(row, list.words[key]!.label, field, item[key], true);
    }
    // A new segment begins where the one before ends; one that says nothing of it is told so.
    if (list.key === "segments" && item.from === undefined) {
      await row.getByLabel(list.words.from!.label, { exact: true }).fill("");
    }
    for (const inner of list.lists) {
      await fillList(row.getByRole("group", { name: new RegExp(`${inner.title}$`) }), inner, item[inner.key]);
    }
  }
}

const adders: Record<string, string> = {
  socket: words.contactAdd,
  segments: words.segmentAdd,
  conductors: words.conductorAdd,
  splices: words.spliceAdd,
  grounds: words.groundAdd,
};

async function openFold(group: Locator): Promise<void> {
  const fold = group.locator("details");
  if ((await fold.count()) > 0 && !(await fold.getAttribute("open").then((open) => open !== null))) {
    await fold.locator("summary").click();
  }
}

/** Enters one value by the label of its field; undefined leaves it alone, null says not known. */
export async function fillField(
  within: Locator,
  label: string,
  field: Field,
  value: unknown,
  compact = false,
): Promise<void> {
  if (value === undefined || field.kind === "photo") return;
  const asks = field.kind === "yes-no" || field.kind === "choice";
  if (asks) return choose(within, label, field, value, compact);
  if (value === null) {
    const toggle = within.getByRole("button", { name: words.notKnownAloud(label), exact: true });
    await toggle.click();
    return expect(toggle).toHaveAttribute("aria-pressed", "true");
  }
  const input = within.getByLabel(label, { exact: true });
  if (typeof value === "object") {
    const { entered } = value as { entered: { value: number; unit: string } };
    await within.getByLabel(words.unitAloud(label), { exact: true }).selectOption(entered.unit);
    return input.fill(String(entered.value));
  }
  await input.fill(String(value));
}

async function choose(
  within: Locator,
  label: string,
  field: Field,
  value: unknown,
  compact: boolean,
): Promise<void> {
  const answer =
    value === null
      ? words.notKnown
      : typeof value === "boolean"
        ? value
          ? words.yes
          : words.no
        : optionWords[String(value)]!;
  const asList = field.kind === "choice" && (compact || field.of.length > 4);
  if (asList) {
    await within.getByRole("combobox", { name: label, exact: true }).selectOption({ label: answer });
    return;
  }
  const group = within.getByRole("radiogroup", { name: label, exact: true });
  await group.getByRole("radio", { name: answer, exact: true }).check();
}

function escaped(text: string): string {
  return text.replace(/[.*+?^${}()|[\]\\]/g, "\\$&");
}
