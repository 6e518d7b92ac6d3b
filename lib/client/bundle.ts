import { get, promisifyRequest, type UseStore } from "idb-keyval";
import { digestOf } from "../domain/digest";
import { bundleShape, type Bundle } from "../domain/field";
import { call, type Answer, type Fetch } from "./api";
import { letGoOfAdopted } from "./local-rigs";

const BUNDLE = ["bundle"];

/** The bundle kept on this phone, or null where none ever came. */
export async function keptBundle(store: UseStore): Promise<Bundle | null> {
  return (await get<Bundle>(BUNDLE, store)) ?? null;
}

/**
 * Fetches the bundle and keeps it. One whose lists do not digest to what they claim is not taken: a walk made against
 * it could never be received. What was made here without an account goes with the same transaction when the bundle is
 * that member's.
 */
export async function fetchBundle(store: UseStore, fetch?: Fetch): Promise<Answer<Bundle>> {
  const answer = await call(bundleShape, "GET", "/api/field/bundle", undefined, fetch);
  if (answer.kind !== "answered") return answer;
  const whole = answer.value.rigs.every(({ revision }) => digestOf(revision.document) === revision.digest);
  if (!whole) return { kind: "unreached" };
  await store("readwrite", async (shelf) => {
    await letGoOfAdopted(shelf, answer.value);
    await promisifyRequest(shelf.put(answer.value, BUNDLE));
  });
  return answer;
}
