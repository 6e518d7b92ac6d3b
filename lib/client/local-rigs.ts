import { get, promisifyRequest, type UseStore } from "idb-keyval";
import { digestOf } from "../domain/digest";
import type { Bundle } from "../domain/field";
import { localWords } from "../domain/messages/account";
import type { RevisionDocument } from "../domain/revision";
import { SIGN_UP } from "../domain/sign-up";

const LOCAL = ["local"];

/**
 * What was made on this phone without an account: rigs, and the member id that walks of them name. The id is random
 * and leaves the phone only at sign-up, when the account takes it over.
 */
export interface LocalRigs {
  member: string;
  rigs: { id: string; name: string; document: RevisionDocument; digest: string; madeAt: string }[];
}

/** A phone without an account keeps as many rigs as a sign-up can bring along. */
export class TooManyRigs extends Error {
  override name = "TooManyRigs";
}

/** What was made here without an account, or null. */
export async function keptLocal(store: UseStore): Promise<LocalRigs | null> {
  return (await get<LocalRigs>(LOCAL, store)) ?? null;
}

/** Keeps a rig, and with the first one the member id, in one strict transaction. */
export async function keepRig(
  store: UseStore,
  { name, document, madeAt }: Pick<LocalRigs["rigs"][number], "name" | "document" | "madeAt">,
): Promise<void> {
  const member = crypto.randomUUID();
  const rig = { id: crypto.randomUUID(), name, document, digest: digestOf(document), madeAt };
  await store("readwrite", async (shelf) => {
    const before: LocalRigs = (await promisifyRequest(shelf.get(LOCAL))) ?? { member, rigs: [] };
    if (before.rigs.length >= SIGN_UP.rigs) throw new TooManyRigs();
    await promisifyRequest(shelf.put({ ...before, rigs: [...before.rigs, rig] }, LOCAL));
  });
}

/**
 * Lets go of what an account has taken over: a server's bundle for the same member. A rig that it does not have, made
 * while the sign-up was under way, stays.
 */
export async function letGoOfAdopted(shelf: IDBObjectStore, bundle: Bundle): Promise<void> {
  const local: LocalRigs | undefined = await promisifyRequest(shelf.get(LOCAL));
  if (local?.member !== bundle.member.id) return;
  const rigs = local.rigs.filter(({ id }) => !bundle.rigs.some((rig) => rig.id === id));
  if (rigs.length > 0) await promisifyRequest(shelf.put({ ...local, rigs }, LOCAL));
  else await promisifyRequest(shelf.delete(LOCAL));
}

/** What was made here, in the form in which a server's bundle comes, for the screens that show one. */
export function localBundle({ member, rigs }: LocalRigs): Bundle {
  const nobody = { id: member, name: localWords.member, email: "" };
  return {
    generatedAt: rigs.at(-1)?.madeAt ?? new Date(0).toISOString(),
    member: {
      ...nobody,
      role: "manager",
      organisation: { id: member, name: localWords.organisation, kind: "household" },
    },
    rigs: rigs.map(({ id, name, document, digest }) => ({
      id,
      name,
      // The server gives a revision its id; here the digest alone names it.
      revision: { id, digest, document },
      openFindings: [],
      lastWalk: null,
    })),
    keys: [],
  };
}
