import { isPlain, type Plain } from './fields';

/** Lays changes over a base, object by object, list of modes place by place; null takes a field away. */
function layOver(base: unknown, changes: unknown): unknown {
  if (changes === undefined) return base;
  if (isPlain(base) && isPlain(changes)) {
    const names = new Set([...Object.keys(base), ...Object.keys(changes)]);
    return Object.fromEntries(
      [...names]
        .filter((name) => changes[name] !== null)
        .map((name) => [
          name,
          // Curves, drifts and pulses are replaced as wholes: half an old curve is no curve.
          name === 'modes' ? layModes(base[name], changes[name]) : (changes[name] ?? base[name]),
        ]),
    );
  }
  return changes;
}

function layModes(base: unknown, changes: unknown): unknown {
  if (!Array.isArray(base) || !Array.isArray(changes)) return changes ?? base;
  return Array.from({ length: Math.max(base.length, changes.length) }, (_, place) =>
    layOver(base[place] ?? {}, changes[place]),
  );
}

/**
 * The whole ratings of a size: what is common to all sizes with the size's own laid over. Operating modes are laid over
 * each other place by place; everything else is replaced as a whole; null takes a field away.
 */
export function sizeOver(common: Plain, size: Plain): Plain {
  return withoutNulls(plainOf(layOver(common, size)));
}

/** A revision that says `basedOn` written out: what it gives laid over what the other gives. */
export function revisionOver(base: Plain, changes: Plain): Plain {
  const sizes = { ...plainOf(base['sizes']) };
  for (const [code, size] of Object.entries(plainOf(changes['sizes']))) {
    sizes[code] = layOver(plainOf(sizes[code]), size);
  }
  return {
    ...base,
    ...changes,
    common: layOver(plainOf(base['common']), plainOf(changes['common'])),
    sizes,
  };
}

function withoutNulls(plain: Plain): Plain {
  return Object.fromEntries(Object.entries(plain).filter(([, value]) => value !== null));
}

function plainOf(value: unknown): Plain {
  return isPlain(value) ? value : {};
}
