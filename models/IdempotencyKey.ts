import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { filled, json, key, moment, text, uuid } from "./columns";
import { connection } from "./connection";

/** What a person's creating request with a key of its own came to; lives for 48 hours. */
export class IdempotencyKey extends Model<InferAttributes<IdempotencyKey>, InferCreationAttributes<IdempotencyKey>> {
  declare userId: string;
  declare key: string;
  declare route: string;
  declare bodyHash: string;
  declare answer: object;
  declare madeAt: CreationOptional<Date>;
}

IdempotencyKey.init(
  {
    userId: key(uuid()),
    key: key(text()),
    route: text(),
    bodyHash: text(),
    answer: json(),
    madeAt: filled(moment()),
  },
  { sequelize: connection, modelName: "IdempotencyKey", tableName: "idempotency_keys" },
);
