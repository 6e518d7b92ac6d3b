import type { Role } from "./member";

/** Everything that a role decides. `walks.read-all` means those of one's organisation and of the rigs it keeps. */
export const actions = ["walks.record", "walks.read-own", "walks.read-all", "devices.register"] as const;
export type Action = (typeof actions)[number];

const table: Record<Role, readonly Action[]> = {
  driver: ["walks.record", "walks.read-own", "devices.register"],
  installer: ["walks.record", "walks.read-own", "walks.read-all", "devices.register"],
  manager: ["walks.record", "walks.read-own", "walks.read-all", "devices.register"],
  auditor: ["walks.read-own", "walks.read-all", "devices.register"],
};

/** Who may do what: hides the button in the browser, refuses the request on the server. */
export function may(role: Role, action: Action): boolean {
  return table[role].includes(action);
}
