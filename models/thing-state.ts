import {
  DataTypes,
  Model,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from "sequelize";
import { canonicalBytes, count, id } from "./columns";

/**
 * What a rig's revision says of a thing, where that differs from the revision before it. `present` is false where the
 * thing left the rig; `body` is then what was last said of it.
 */
export class ThingState extends Model<InferAttributes<ThingState>, InferCreationAttributes<ThingState>> {
  declare thingId: string;
  declare rigId: string;
  declare number: number;
  declare present: boolean;
  declare body: Buffer;

  static bind(sequelize: Sequelize): void {
    this.init(
      {
        thingId: id({ primaryKey: true }),
        rigId: id({ primaryKey: true }),
        number: count({ primaryKey: true }),
        present: { type: DataTypes.BOOLEAN, allowNull: false },
        body: canonicalBytes(),
      },
      { sequelize, modelName: "ThingState", tableName: "thing_states" },
    );
  }
}
