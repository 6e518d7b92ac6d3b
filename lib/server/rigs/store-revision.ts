import { randomUUID } from "node:crypto";
import type { Transaction } from "sequelize";
import { compose } from "@/lib/domain/catalogue/compose";
import { sha256Hex } from "@/lib/domain/digest";
import { canonicalText } from "@/lib/domain/json";
import type { Member } from "@/lib/domain/member";
import { revisionShape, type RevisionDocument } from "@/lib/domain/revision";
import type { Sheet } from "@/lib/domain/sheet/sheet";
import { tables } from "../database";
import { recordThings } from "../things/recording";

/** A sheet with the list that today's catalogue makes of it. */
export interface Composed {
  sheet: Sheet;
  document: RevisionDocument;
  /** Canonical text of the document, and its digest. */
  text: string;
  digest: string;
}

/** Composes a sheet. Throws where the catalogue made a list that phones would refuse: that is a bug of ours. */
export function composed(sheet: Sheet): Composed {
  const document = compose(sheet);
  revisionShape.parse(document);
  const text = canonicalText(document);
  return { sheet, document, text, digest: sha256Hex(text) };
}

/** What a revision is written with. */
export interface Author {
  member: Pick<Member, "id" | "organisation">;
  now: Date;
  transaction: Transaction;
}

/**
 * Writes a rig's next revision, what it says anew of its things (which `claimThings` has seen to), and the photographs
 * that it names.
 */
export async function storeRevision(
  author: Author,
  rigId: string,
  number: number,
  { sheet, text, digest }: Composed,
): Promise<void> {
  const { Revision, SheetPhoto } = tables();
  const { member, now, transaction } = author;
  await Revision.create(
    {
      id: randomUUID(),
      rigId,
      number,
      memberId: member.id,
      digest: Buffer.from(digest, "hex"),
      document: Buffer.from(text),
      createdAt: now,
    },
    { transaction },
  );
  await recordThings(author, rigId, number, sheet);
  const photo = sheet.procedure?.photo;
  if (photo) {
    const { sha256, bytes, mime } = photo;
    const organisationId = member.organisation.id;
    await SheetPhoto.create(
      { rigId, number, organisationId, sha256: Buffer.from(sha256, "hex"), bytes, mime },
      { transaction },
    );
  }
}
