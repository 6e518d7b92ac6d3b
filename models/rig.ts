import { Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from "sequelize";
import { id, instant, name } from "./columns";

/** One coach with one car and the gear between them: who has it now, and which shop built it. */
export class Rig extends Model<InferAttributes<Rig>, InferCreationAttributes<Rig>> {
  declare id: string;
  declare name: string;
  declare keeperId: string;
  declare builderId: string | null;
  declare createdAt: Date;

  static bind(sequelize: Sequelize): void {
    this.init(
      {
        id: id({ primaryKey: true }),
        name: name(),
        keeperId: id(),
        builderId: id({ allowNull: true }),
        createdAt: instant(),
      },
      { sequelize, modelName: "Rig", tableName: "rigs" },
    );
  }
}
