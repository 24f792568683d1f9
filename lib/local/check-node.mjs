import { Refusal } from "./refusal.mjs";

const OLDEST = [20, 11];

/** @param {string} [version] such as "20.11.1" */
export function checkNode(version = process.versions.node) {
  const [major = 0, minor = 0] = version.split(".").map(Number);
  const [oldMajor = 0, oldMinor = 0] = OLDEST;
  if (major > oldMajor || (major === oldMajor && minor >= oldMinor)) return;
  throw new Refusal(
    `This is Node ${version}; Ringwright needs ${OLDEST.join(".")} or newer. ` +
      "Install Node 20 (https://nodejs.org/en/download) and type the command again.",
  );
}
