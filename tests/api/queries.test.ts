import { readdirSync, readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import ts from "typescript";
import { describe, expect, it } from "vitest";

/** Reads the sources for forms of the database layer that let a request's text become more than a value. */

const root = fileURLToPath(new URL("../..", import.meta.url));
const reading = new Set(["findAll", "findOne", "findByPk", "findAndCountAll", "count", "max", "min", "sum", "reload"]);
const writing = new Set(["create", "bulkCreate", "update", "upsert", "save", "findOrCreate", "increment", "decrement"]);
const removing = new Set(["destroy", "truncate", "restore"]);
const raw = new Set(["query", "literal", "json"]);

/** The one place that may speak SQL, with bound values: a waiting job is claimed by one statement. */
const claim = "app/_server/jobs/queue.ts";

interface Call {
  place: string;
  name: string;
  /** What the method is called on. */
  on: string;
  node: ts.CallExpression;
  /** The properties of every object among the arguments, by name. */
  options: Map<string, ts.Expression | undefined>;
}

function filesIn(folder: string): string[] {
  return readdirSync(root + folder, { recursive: true, encoding: "utf8" })
    .filter((file) => /\.tsx?$/.test(file))
    .map((file) => `${folder}/${file}`);
}

function callsIn(file: string, text: string): Call[] {
  const source = ts.createSourceFile(file, text, ts.ScriptTarget.Latest, true);
  const calls: Call[] = [];
  function visit(node: ts.Node) {
    if (ts.isCallExpression(node)) {
      const { expression } = node;
      const name = ts.isPropertyAccessExpression(expression) ? expression.name.text : ts.isIdentifier(expression) ? expression.text : "";
      const on = ts.isPropertyAccessExpression(expression) ? expression.expression.getText(source) : "";
      const { line } = source.getLineAndCharacterOfPosition(node.getStart(source));
      if (isOfDatabase(name, on)) calls.push({ place: `${file}:${line + 1} ${on}.${name}`, name, on, node, options: optionsOf(node) });
    }
    ts.forEachChild(node, visit);
  }
  visit(source);
  return calls;
}

/** Models bear capitals; rows that were read are named after them in small letters. */
function isOfDatabase(name: string, on: string): boolean {
  if (raw.has(name)) return on !== "z" && (name !== "json" || /^(Sequelize|sequelize|connection)$/.test(on));
  const known = reading.has(name) || writing.has(name) || removing.has(name);
  return known && (/^[A-Z]\w+$/.test(on) || /(^|\.)(model|project|user|team|session|old|row|job|token)$/.test(on)) && !/^(Math|Object|Response|Number|Promise|Array|Buffer)$/.test(on);
}

function optionsOf(node: ts.CallExpression): Call["options"] {
  const options: Call["options"] = new Map();
  for (const argument of node.arguments.filter(ts.isObjectLiteralExpression)) {
    for (const property of argument.properties) {
      if (ts.isPropertyAssignment(property)) options.set(property.name.getText(), property.initializer);
      if (ts.isShorthandPropertyAssignment(property)) options.set(property.name.text, property.name);
    }
  }
  return options;
}

/** Every object that a name stands for in its file: a constant, what a short function gives, a field of that name. */
function objectsNamed(name: string, source: ts.SourceFile): ts.Expression[] {
  const found: ts.Expression[] = [];
  function visit(node: ts.Node) {
    const named = (ts.isVariableDeclaration(node) || ts.isPropertyAssignment(node)) && node.name.getText() === name;
    if (named && node.initializer && !ts.isIdentifier(node.initializer)) found.push(node.initializer);
    ts.forEachChild(node, visit);
  }
  visit(source);
  return found;
}

/** Keys of a condition must stand in the source, also in what is spread into it; a computed one is an operator of ours. */
function isPlainCondition(where: ts.Expression | undefined, isWhole = true, within: readonly string[] = []): boolean {
  if (!where) return false;
  if (ts.isParenthesizedExpression(where)) return isPlainCondition(where.expression, isWhole, within);
  if (ts.isConditionalExpression(where)) return [where.whenTrue, where.whenFalse].every((one) => isPlainCondition(one, isWhole, within));
  if (ts.isArrowFunction(where)) return ts.isExpression(where.body) && isPlainCondition(where.body, isWhole, within);
  const name = ts.isIdentifier(where) ? where.text : ts.isCallExpression(where) ? where.expression.getText() : undefined;
  if (name) {
    if (within.includes(name)) return true; // being looked at already
    const objects = objectsNamed(name, where.getSourceFile());
    return objects.length > 0 && objects.every((object) => isPlainCondition(object, isWhole, [...within, name]));
  }
  if (!ts.isObjectLiteralExpression(where) || (isWhole && where.properties.length === 0)) return false;
  return where.properties.every((property) => {
    if (ts.isSpreadAssignment(property)) return isPlainCondition(property.expression, false, within);
    const { name: key } = property;
    return !!key && (!ts.isComputedPropertyName(key) || /^Op\.\w+$/.test(key.expression.getText()));
  });
}

/** What is written is named field by field: by `fields`, or because the values themselves stand in the source. */
function isNamed({ node, options }: Call): boolean {
  if (options.has("fields")) return true;
  const [values] = node.arguments;
  const rows = values && ts.isArrayLiteralExpression(values) ? [...values.elements] : values ? [values] : [];
  return rows.length > 0 && rows.every((row) => ts.isStringLiteral(row) || (ts.isObjectLiteralExpression(row) && row.properties.length > 0 && !row.properties.some(ts.isSpreadAssignment)));
}

/** Every name inside is written out, or the result of a function of the database on such. */
function isWrittenOut(list: ts.Expression | undefined): boolean {
  return !list || !/\b(body|params|request|patch|values|query|searchParams)\b/.test(list.getText().replace(/"[^"]*"/g, '""'));
}

/** Whether the code around a call works inside a transaction. */
function isInTransaction(node: ts.Node): boolean {
  for (let at: ts.Node | undefined = node.parent; at; at = at.parent) {
    if (ts.isFunctionLike(at) && at.parameters.some((parameter) => /\b(transaction|place|making)\b/i.test(parameter.name.getText()))) return true;
  }
  return false;
}

function faultsOf(file: string, text: string): string[] {
  return callsIn(file, text).flatMap((call) => {
    const { place, name, options, on, node } = call;
    const faults: string[] = [];
    if (raw.has(name)) return file === claim && options.has("bind") ? [] : [`${place}: SQL text`];
    if (writing.has(name) && name !== "save" && !isNamed(call)) faults.push(`${place}: writes whatever it is given (no fields)`);
    const needsWhere = /^[A-Z]/.test(on) && (name === "update" || removing.has(name));
    if (needsWhere && !options.has("where")) faults.push(`${place}: no condition`);
    if (options.has("where") && !isPlainCondition(options.get("where"))) faults.push(`${place}: a condition whose keys are not written out`);
    for (const list of ["order", "attributes", "include", "group"]) {
      if (!isWrittenOut(options.get(list))) faults.push(`${place}: ${list} from what was asked`);
    }
    if (isInTransaction(node) && !options.has("transaction") && !options.has("...place")) faults.push(`${place}: outside the transaction around it`);
    return faults;
  });
}

describe("the sources never let a request speak to the database", () => {
  const files = ["app", "models"].flatMap(filesIn).map((file) => ({ file, text: readFileSync(root + file, "utf8") }));

  it("the reader finds the calls", () => {
    expect(files.flatMap(({ file, text }) => callsIn(file, text)).length).toBeGreaterThan(40);
  });

  it("no file holds a forbidden form", () => {
    expect(files.flatMap(({ file, text }) => faultsOf(file, text))).toEqual([]);
  });

  it.each([
    ["SQL text", 'connection.query("select 1")'],
    ["SQL text", "literal(text)"],
    ["a condition whose keys are not written out", "User.findOne({ where: body })"],
    ["a condition whose keys are not written out", "User.findOne({ where: { [key]: 1 } })"],
    ["a condition whose keys are not written out", "User.findOne({ where: { id, ...more } })"],
    ["a condition whose keys are not written out", "User.findAll({ where: {} })"],
    ["a condition whose keys are not written out", "const where = { id, ...body.where }; User.findOne({ where })"],
    ["a condition whose keys are not written out", "const where = {}; User.destroy({ where })"],
    ["a condition whose keys are not written out", "const of = (body) => body; User.findOne({ where: of(body) })"],
    ["no condition", "User.destroy({ truncate: true })"],
    ["no fields", "User.create(body)"],
    ["no fields", "User.create({ id, ...body })"],
    ["no fields", "user.update(body, { transaction })"],
    ["order from what was asked", "User.findAll({ order: [[params.sort, 'ASC']] })"],
    ["outside the transaction around it", "async function f(transaction: Transaction) { await User.findOne({ where: { id } }); }"],
  ])("%s is seen: %s", (fault, text) => {
    expect(faultsOf("app/x.ts", text).join()).toContain(fault);
  });

  it("the database layer is new enough to hold no known hole", async () => {
    const { version } = JSON.parse(readFileSync(`${root}node_modules/sequelize/package.json`, "utf8")) as { version: string };
    const [major, minor, patch] = version.split(".").map(Number) as [number, number, number];
    expect(major === 6 && (minor > 37 || (minor === 37 && patch >= 8))).toBe(true);
  });
});
