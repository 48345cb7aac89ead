import { DataTypes, type ModelAttributeColumnOptions } from "sequelize";

type Column = ModelAttributeColumnOptions;

/** The columns that come back in table after table. A fresh object each: a model writes its own names into them. */
export const uuid = (): Column => ({ type: DataTypes.UUID, allowNull: false });
export const optionalUuid = (): Column => ({ type: DataTypes.UUID, allowNull: true });
export const text = (): Column => ({ type: DataTypes.TEXT, allowNull: false });
export const optionalText = (): Column => ({ type: DataTypes.TEXT, allowNull: true });
export const integer = (): Column => ({ type: DataTypes.INTEGER, allowNull: false });
export const double = (): Column => ({ type: DataTypes.DOUBLE, allowNull: false });
export const boolean = (): Column => ({ type: DataTypes.BOOLEAN, allowNull: false });
export const moment = (): Column => ({ type: DataTypes.DATE, allowNull: false });
export const optionalMoment = (): Column => ({ type: DataTypes.DATE, allowNull: true });
export const json = (): Column => ({ type: DataTypes.JSONB, allowNull: false });

export const key = (column: Column): Column => ({ ...column, primaryKey: true });
/** A column the database fills by itself. */
export const filled = (column: Column): Column => ({ ...column, allowNull: true });

/** What every part of a plan has: its project, its key, its place in the order, and what only its kind understands. */
export const partColumns = () => ({
  projectId: key(uuid()),
  id: key(uuid()),
  rank: { ...integer(), defaultValue: 0 },
  params: json(),
});
