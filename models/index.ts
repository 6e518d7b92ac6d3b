import type { Sequelize } from "sequelize";
import { Device } from "./device";
import { Entry } from "./entry";
import { Fork } from "./fork";
import { Invitation } from "./invitation";
import { Member } from "./member";
import { Organisation } from "./organisation";
import { PhotoEntry } from "./photo-entry";
import { PhotoObject } from "./photo-object";
import { Revision } from "./revision";
import { Rig } from "./rig";
import { Session } from "./session";
import { SheetPhoto } from "./sheet-photo";
import { Thing } from "./thing";
import { ThingState } from "./thing-state";
import { Walk } from "./walk";

const tables = {
  Organisation,
  Member,
  Session,
  Device,
  Rig,
  Revision,
  Walk,
  Entry,
  Fork,
  PhotoEntry,
  PhotoObject,
  Thing,
  ThingState,
  SheetPhoto,
  Invitation,
};
export type Tables = typeof tables;

/**
 * Binds every model to a connection and to each other. Safe to call again: a bundler may load these classes more
 * than once beside one shared connection, and each copy has to be bound.
 */
export function bindModels(sequelize: Sequelize): Tables {
  if (Organisation.sequelize === sequelize) return tables;
  for (const table of Object.values(tables)) table.bind(sequelize);

  Member.belongsTo(Organisation, { as: "organisation", foreignKey: "organisationId" });
  Session.belongsTo(Member, { as: "member", foreignKey: "memberId" });
  Device.belongsTo(Member, { as: "member", foreignKey: "memberId" });
  Rig.belongsTo(Organisation, { as: "keeper", foreignKey: "keeperId" });
  Rig.belongsTo(Organisation, { as: "builder", foreignKey: "builderId" });
  Revision.belongsTo(Rig, { as: "rig", foreignKey: "rigId" });
  Revision.belongsTo(Member, { as: "member", foreignKey: "memberId" });
  Walk.belongsTo(Rig, { as: "rig", foreignKey: "rigId" });
  Walk.belongsTo(Revision, { as: "revision", foreignKey: "revisionId" });
  Walk.belongsTo(Member, { as: "member", foreignKey: "memberId" });
  Walk.belongsTo(Device, { as: "sealDevice", foreignKey: "sealDeviceId" });
  Entry.belongsTo(Walk, { as: "walk", foreignKey: "walkId" });
  Fork.belongsTo(Walk, { as: "walk", foreignKey: "walkId" });
  PhotoEntry.belongsTo(Walk, { as: "walk", foreignKey: "walkId" });
  PhotoObject.belongsTo(Organisation, { as: "organisation", foreignKey: "organisationId" });
  Thing.belongsTo(Organisation, { as: "organisation", foreignKey: "organisationId" });
  ThingState.belongsTo(Thing, { as: "thing", foreignKey: "thingId" });
  ThingState.belongsTo(Rig, { as: "rig", foreignKey: "rigId" });
  SheetPhoto.belongsTo(Rig, { as: "rig", foreignKey: "rigId" });
  return tables;
}
