import type { Role } from "./member";

/**
 * Everything that a role decides. `walks.read-all` means those of one's organisation and of the rigs it keeps;
 * `rigs.read` the rigs that it keeps or has built, `rigs.write` those that it keeps.
 */
export const actions = [
  "walks.record",
  "walks.read-own",
  "walks.read-all",
  "devices.register",
  "rigs.read",
  "rigs.write",
  "people.invite",
] as const;
export type Action = (typeof actions)[number];

const table: Record<Role, readonly Action[]> = {
  driver: ["walks.record", "walks.read-own", "devices.register", "rigs.read"],
  installer: [
    "walks.record",
    "walks.read-own",
    "walks.read-all",
    "devices.register",
    "rigs.read",
    "rigs.write",
  ],
  manager: [...actions],
  auditor: ["walks.read-own", "walks.read-all", "devices.register", "rigs.read"],
};

/** Who may do what: hides the button in the browser, refuses the request on the server. */
export function may(role: Role, action: Action): boolean {
  return table[role].includes(action);
}
