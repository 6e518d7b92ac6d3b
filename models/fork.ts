import { Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from "sequelize";
import { canonicalBytes, count, digest, id, instant } from "./columns";

/** A second content that came for a stored sequence number: kept apart, it never replaces the first. */
export class Fork extends Model<InferAttributes<Fork>, InferCreationAttributes<Fork>> {
  declare walkId: string;
  declare seq: number;
  declare digest: Buffer;
  declare bytes: Buffer;
  declare deviceId: string;
  declare memberId: string;
  declare receivedAt: Date;

  static bind(sequelize: Sequelize): void {
    this.init(
      {
        walkId: id({ primaryKey: true }),
        seq: count({ primaryKey: true }),
        digest: digest({ primaryKey: true }),
        bytes: canonicalBytes(),
        deviceId: id(),
        memberId: id(),
        receivedAt: instant(),
      },
      { sequelize, modelName: "Fork", tableName: "forks" },
    );
  }
}
