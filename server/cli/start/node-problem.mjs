const NEEDED = [20, 19];

/** Says in one sentence why this version of Node.js cannot run the program, or null when it can. */
export const nodeProblem = (version = process.versions.node) => {
  const [major = 0, minor = 0] = version.split('.').map(Number);
  if (major > NEEDED[0] || (major === NEEDED[0] && minor >= NEEDED[1])) return null;
  return `Ladlemark needs Node.js ${NEEDED.join('.')} or newer; this is ${version}. Install a newer one and start again.`;
};
