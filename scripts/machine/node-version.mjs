const NEEDED = { major: 20, minor: 20 };

/** @param {string} version such as `20.20.2` */
export function isNewEnough(version) {
  const [major = 0, minor = 0] = version.split('.').map(Number);
  return major > NEEDED.major || (major === NEEDED.major && minor >= NEEDED.minor);
}

export const NEEDED_VERSION = `${NEEDED.major}.${NEEDED.minor}`;
