import "server-only";
import type { Member } from "@/lib/domain/member";
import { may } from "@/lib/domain/permissions";
import { tables } from "./database";

/**
 * Whether a member may see a walk: their own; by role also those that members of the organisation made and those of
 * the rigs that it keeps now.
 */
export async function maySeeWalk(
  { id, role, organisation }: Member,
  walk: { memberId: string; organisationId: string; rigId: string },
): Promise<boolean> {
  if (walk.memberId === id) return true;
  if (!may(role, "walks.read-all")) return false;
  if (walk.organisationId === organisation.id) return true;
  const { Rig } = tables();
  return (await Rig.count({ where: { id: walk.rigId, keeperId: organisation.id } })) > 0;
}
