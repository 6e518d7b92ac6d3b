import {
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from "sequelize";
import { canonicalBytes, count, digest, id, instant } from "./columns";

/**
 * One immutable state of a rig's sheet and list. `digest` is that of `document`'s bytes; `number` counts from 1. Two of a
 * rig share a digest where someone went back to an earlier sheet.
 */
export class Revision extends Model<InferAttributes<Revision>, InferCreationAttributes<Revision>> {
  declare id: string;
  declare rigId: string;
  declare number: number;
  /** Who saved it; null where a phone made it before there was an account. */
  declare memberId: CreationOptional<string | null>;
  declare digest: Buffer;
  declare document: Buffer;
  declare createdAt: Date;

  static bind(sequelize: Sequelize): void {
    this.init(
      {
        id: id({ primaryKey: true }),
        rigId: id(),
        number: count(),
        memberId: id({ allowNull: true }),
        digest: digest(),
        document: canonicalBytes(),
        createdAt: instant(),
      },
      { sequelize, modelName: "Revision", tableName: "revisions" },
    );
  }
}
