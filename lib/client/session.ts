import * as z from "zod/mini";
import { memberShape, type Credentials, type Member, type Role } from "../domain/member";
import { may } from "../domain/permissions";
import { call, type Answer, type Fetch } from "./api";

const sessionShape = z.object({ member: memberShape });

/** Opens a session. */
export function signIn(credentials: Credentials, fetch?: Fetch): Promise<Answer<{ member: Member }>> {
  return call(sessionShape, "POST", "/api/session", credentials, fetch);
}

/** Whose session this is. */
export function whoAmI(fetch?: Fetch): Promise<Answer<{ member: Member }>> {
  return call(sessionShape, "GET", "/api/session", undefined, fetch);
}

/** Ends the session. */
export function signOut(fetch?: Fetch): Promise<Answer<void>> {
  return call<void>(null, "DELETE", "/api/session", undefined, fetch);
}

/**
 * A path of our own, as someone may have left it in a query string, or null. One slash first, no second one and no
 * backslash anywhere: browsers read both as the start of another host. Control characters too, since a browser drops
 * tabs and line ends from an address before it reads it.
 */
export function localPath(wanted: string | null): string | null {
  return wanted !== null && /^\/(?!.*(?:\/\/|\\))(?!\/)[^\u0000-\u0020\u007f]*$/.test(wanted) ? wanted : null;
}

/** Where a member goes after signing in: where they were headed, or to the wing that their role works in. */
export function destination(role: Role, wanted: string | null): string {
  return localPath(wanted) ?? (may(role, "walks.record") ? "/field" : "/desk");
}

/** A navigation of the browser's own: nothing that this page has read stays in memory. */
export function leaveFor(path: string): void {
  window.location.assign(path);
}

/** The sign-in page that comes back here afterwards. */
export function signInPath(here: { pathname: string; search: string }): string {
  return `/sign-in?then=${encodeURIComponent(here.pathname + here.search)}`;
}

/**
 * Reloads a page that the browser brings back whole from its memory: it may show someone who has left since.
 * @returns what stops it
 */
export function reloadWhenRestored(): () => void {
  const restored = (event: PageTransitionEvent) => event.persisted && window.location.reload();
  window.addEventListener("pageshow", restored);
  return () => window.removeEventListener("pageshow", restored);
}
