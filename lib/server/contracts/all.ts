import type { Contract } from "../contract";
import { registerDevice } from "./devices";
import { readBundle, sendEntries } from "./field";
import { invite, join, listInvitations, listPeople, readInvitation, withdrawInvitation } from "./people";
import { askForPhoto, readPhoto, sendPhoto } from "./photos";
import {
  listRigs,
  listThings,
  makeRig,
  readRevision,
  readRig,
  readSheetSchema,
  readThing,
  saveRevision,
} from "./rigs";
import { readHealth, readKeys, readOpenApi } from "./service";
import { signIn, signOut, whoAmI } from "./session";
import { signUp } from "./sign-up";
import { listWalks, readRecord, readWalk } from "./walks";

/** Every route there is, in the order in which the OpenAPI document lists them. */
export const contracts: readonly Contract[] = [
  signIn,
  whoAmI,
  signOut,
  signUp,
  listPeople,
  listInvitations,
  invite,
  withdrawInvitation,
  readInvitation,
  join,
  registerDevice,
  readBundle,
  sendEntries,
  askForPhoto,
  sendPhoto,
  readPhoto,
  listWalks,
  readWalk,
  readRecord,
  listRigs,
  makeRig,
  readRig,
  saveRevision,
  readRevision,
  listThings,
  readThing,
  readSheetSchema,
  readKeys,
  readHealth,
  readOpenApi,
];
