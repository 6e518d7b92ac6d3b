import {
  DataTypes,
  Model,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from "sequelize";
import type { Algorithm } from "@/lib/domain/signature";
import { code, id, instant, name } from "./columns";

/** A phone's registered key. `publicKey` is the JWK as JSON text, `thumbprint` its RFC 7638 thumbprint. */
export class Device extends Model<InferAttributes<Device>, InferCreationAttributes<Device>> {
  declare id: string;
  declare memberId: string;
  declare alg: Algorithm;
  declare thumbprint: string;
  declare publicKey: string;
  declare label: string;
  declare createdAt: Date;

  static bind(sequelize: Sequelize): void {
    this.init(
      {
        id: id({ primaryKey: true }),
        memberId: id(),
        alg: code(),
        thumbprint: { type: DataTypes.CHAR(43), allowNull: false },
        publicKey: { type: DataTypes.TEXT, allowNull: false },
        label: name(),
        createdAt: instant(),
      },
      { sequelize, modelName: "Device", tableName: "devices" },
    );
  }
}
