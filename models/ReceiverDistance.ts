import { type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { double, key, uuid } from "./columns";
import { connection } from "./connection";

/** How far a listener is from a source in the same room, where it is given. */
export class ReceiverDistance extends Model<InferAttributes<ReceiverDistance>, InferCreationAttributes<ReceiverDistance>> {
  declare projectId: string;
  declare receiverId: string;
  declare sourceId: string;
  declare metres: number;
}

ReceiverDistance.init(
  { projectId: uuid(), receiverId: key(uuid()), sourceId: key(uuid()), metres: double() },
  { sequelize: connection, modelName: "ReceiverDistance", tableName: "receiver_distances" },
);
