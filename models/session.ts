import { Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from "sequelize";
import { digest, id, instant } from "./columns";

/** A signed-in browser. `id` is the SHA-256 of the session id, which only the browser has. */
export class Session extends Model<InferAttributes<Session>, InferCreationAttributes<Session>> {
  declare id: Buffer;
  declare memberId: string;
  declare expiresAt: Date;

  static bind(sequelize: Sequelize): void {
    this.init(
      { id: digest({ primaryKey: true }), memberId: id(), expiresAt: instant() },
      { sequelize, modelName: "Session", tableName: "sessions" },
    );
  }
}
