import { canonicalText } from "../domain/json";
import type { Sheet } from "../domain/sheet/sheet";
import type { ExportFile } from "./record-export";

/** A sheet as a file to keep: its members in canonical order, indented to be read. */
export function sheetFile(sheet: Sheet): ExportFile {
  const name = sheet.name.replace(/[^\p{L}\p{N}]+/gu, "-").replace(/^-|-$/g, "") || "rig";
  const text = `${JSON.stringify(JSON.parse(canonicalText(sheet)), null, 2)}\n`;
  return { name: `${name}.sheet.json`, text, mime: "application/json" };
}
