import type { Metadata } from "next";
import { FieldWing } from "@/components/field/field-wing";
import { fieldWords } from "@/lib/domain/messages/field";

export const dynamic = "error";
export const metadata: Metadata = { title: { absolute: fieldWords.documentTitle(fieldWords.rigs.title) } };

/** The field wing: rigs and walks, from what is on this phone. */
export default function FieldPage() {
  return <FieldWing />;
}
