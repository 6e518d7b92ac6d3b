import type { UseStore } from "idb-keyval";
import * as z from "zod/mini";
import { memberShape, type Member } from "../domain/member";
import type { SignUp, SignUpForm } from "../domain/sign-up";
import { call, type Answer, type Fetch } from "./api";
import { fetchBundle } from "./bundle";
import { keptLocal, type LocalRigs } from "./local-rigs";

const answerShape = z.object({ member: memberShape });

/** What waits on this phone for an account: rigs by name, and how many walks of each. */
export interface Waiting {
  rigs: { id: string; name: string; walks: number }[];
}

/** What was made here without an account, or null; `walks` are those on this phone. */
export async function waiting(
  store: UseStore,
  walks: () => Promise<readonly { member: string; rig: string }[]>,
): Promise<Waiting | null> {
  const local = await keptLocal(store);
  if (!local) return null;
  const made = (await walks()).filter(({ member }) => member === local.member);
  const count = (id: string) => made.filter(({ rig }) => rig === id).length;
  return { rigs: local.rigs.map(({ id, name }) => ({ id, name, walks: count(id) })) };
}

/**
 * Signs up with what was made here without an account. Then the account's bundle takes its place on this phone; should
 * that not come just now, the field wing asks for it again.
 * @throws when the phone's store cannot be read: an account without its walks could not have them later
 */
export async function signUp(
  store: UseStore,
  form: SignUpForm,
  fetch?: Fetch,
): Promise<Answer<{ member: Member }>> {
  const body: SignUp = { ...form, ...brought(await readable(store)) };
  const answer = await call(answerShape, "POST", "/api/sign-up", body, fetch);
  if (answer.kind === "answered") await fetchBundle(store, fetch).catch(() => null);
  return answer;
}

function brought(local: LocalRigs | null): Pick<SignUp, "member" | "rigs"> {
  if (!local) return {};
  return {
    member: local.member,
    rigs: local.rigs.map(({ id, name, document }) => ({ id, name, document })),
  };
}

/** A browser that keeps nothing at all has nothing to bring along. */
async function readable(store: UseStore): Promise<LocalRigs | null> {
  try {
    return await keptLocal(store);
  } catch (error) {
    if (error instanceof DOMException && error.name === "SecurityError") return null;
    throw error;
  }
}
