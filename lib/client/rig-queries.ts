import { queryOptions } from "@tanstack/react-query";
import {
  revisionReadingShape,
  rigListShape,
  rigReadingShape,
  savedShape,
  thingListShape,
  thingReadingShape,
  type Saved,
} from "../domain/rigs";
import type { Sheet } from "../domain/sheet/sheet";
import { UUID } from "../domain/uuid";
import { read, send } from "./desk-queries";

const DIGEST = /^[0-9a-f]{64}$/;

/** The rigs that this member's organization keeps or built. */
export const rigsQuery = queryOptions({
  queryKey: ["rigs"],
  queryFn: () => read(rigListShape, "/api/rigs"),
});

/** One rig with its latest revision whole; an id that cannot be one is not asked for. */
export function rigQuery(id: string) {
  return queryOptions({
    queryKey: ["rig", id],
    queryFn: () => read(rigReadingShape, `/api/rigs/${id}`),
    enabled: UUID.test(id),
  });
}

/** One revision of a rig, whole. It never changes, so it is fetched once. */
export function revisionQuery(rig: string, digest: string | null) {
  return queryOptions({
    queryKey: ["revision", rig, digest],
    queryFn: () => read(revisionReadingShape, `/api/rigs/${rig}/revisions/${digest}`),
    enabled: UUID.test(rig) && digest !== null && DIGEST.test(digest),
    staleTime: Infinity,
  });
}

/** The coaches, cars and pieces of gear of this member's organization. */
export const thingsQuery = queryOptions({
  queryKey: ["things"],
  queryFn: () => read(thingListShape, "/api/things"),
});

/** One of them with its history. */
export function thingQuery(id: string) {
  return queryOptions({
    queryKey: ["thing", id],
    queryFn: () => read(thingReadingShape, `/api/things/${id}`),
    enabled: UUID.test(id),
  });
}

/** Makes a new revision of a rig over the one with digest `base`; throws `Refused` or `Unreached`. */
export function reviseRig(rig: string, base: string, sheet: Sheet): Promise<Saved> {
  return send(savedShape, `/api/rigs/${rig}/revisions`, { base, sheet });
}
