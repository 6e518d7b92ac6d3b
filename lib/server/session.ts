import "server-only";
import { Lucia, TimeSpan } from "lucia";
import type { Member } from "@/lib/domain/member";
import { sessionAdapter } from "./session-adapter";
import { settings } from "./settings";

declare module "lucia" {
  interface Register {
    Lucia: ReturnType<typeof makeLucia>;
    DatabaseUserAttributes: Omit<Member, "id">;
  }
}

function makeLucia() {
  return new Lucia(sessionAdapter, {
    sessionExpiresIn: new TimeSpan(30, "d"),
    sessionCookie: {
      name: settings.cookie.name,
      attributes: { secure: settings.cookie.secure, sameSite: "lax", path: "/" },
    },
    getUserAttributes: ({ name, email, role, organisation }) => ({ name, email, role, organisation }),
  });
}

let made: ReturnType<typeof makeLucia> | undefined;

// At first use, since importing this must not read the settings: a build does it without any.
function lucia(): ReturnType<typeof makeLucia> {
  return (made ??= makeLucia());
}

/** Someone who is signed in. */
export interface SignedIn {
  sessionId: string;
  member: Member;
  /** A `Set-Cookie` value when the session was just prolonged, else null. */
  renewal: string | null;
}

/** Who sent this request, by its session cookie; null when nobody is signed in or the session has ended. */
export async function signedIn(request: Request): Promise<SignedIn | null> {
  const presented = presentedId(request.headers.get("cookie") ?? "");
  if (!presented) return null;
  const { session, user } = await lucia().validateSession(presented);
  if (!session) return null;
  const { id, name, email, role, organisation } = user;
  return {
    sessionId: session.id,
    member: { id, name, email, role, organisation },
    renewal: session.fresh ? lucia().createSessionCookie(session.id).serialize() : null,
  };
}

/**
 * The session id in a Cookie header. lucia's own reader decodes every cookie and throws at one that is malformed, and
 * other programs on this host may have set such a one.
 */
function presentedId(header: string): string | undefined {
  const cookies = header.split(";").map((cookie) => cookie.trim().split("="));
  return cookies.find(([name]) => name === lucia().sessionCookieName)?.[1];
}

/** Begins a session, clears away those that have run out, and returns the `Set-Cookie` value. */
export async function beginSession(memberId: string): Promise<string> {
  await lucia().deleteExpiredSessions();
  const session = await lucia().createSession(memberId, {});
  return lucia().createSessionCookie(session.id).serialize();
}

/** Ends a session, if there is one, and returns the `Set-Cookie` value that clears it from the browser. */
export async function endSession(sessionId: string | undefined): Promise<string> {
  if (sessionId) await lucia().invalidateSession(sessionId);
  return lucia().createBlankSessionCookie().serialize();
}
