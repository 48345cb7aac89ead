import { type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { integer, key, moment, text } from "./columns";
import { connection } from "./connection";

/** How often something was tried; the key is a keyed hash of what was tried by whom. */
export class Throttle extends Model<InferAttributes<Throttle>, InferCreationAttributes<Throttle>> {
  declare key: string;
  declare tries: number;
  declare since: Date;
  declare lastAt: Date;
}

Throttle.init(
  {
    key: key(text()),
    tries: integer(),
    since: moment(),
    lastAt: moment(),
  },
  { sequelize: connection, modelName: "Throttle", tableName: "throttles" },
);
