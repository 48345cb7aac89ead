// Runs before everything else, in words that a Node of any age can read.
var version = process.versions.node.split(".");
var isOld = Number(version[0]) < 20 || (Number(version[0]) === 20 && Number(version[1]) < 9);
if (isOld) {
  console.error("Stillyard needs Node 20.9 or newer; this is " + process.versions.node + ". Install a newer one and try again.");
  process.exit(1);
}
