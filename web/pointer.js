// How is one place of a record read, set or removed without touching the rest? JSON pointers (RFC 6901), immutably.

/** @param {string} path @returns {string[]} */
export function parts(path) {
  if (path === '') return [];
  return path.slice(1).split('/').map((part) => part.replace(/~1/g, '/').replace(/~0/g, '~'));
}

/** @param {any} value @param {string} path @returns {any} undefined where nothing stands */
export function getAt(value, path) {
  let here = value;
  for (const part of parts(path)) {
    if (here === null || typeof here !== 'object' || !Object.hasOwn(here, part)) return undefined;
    here = here[part];
  }
  return here;
}

/**
 * A copy of `value` with `next` at `path`; missing objects on the way are made.
 * @param {any} value @param {string} path @param {any} next @returns {any}
 */
export function setAt(value, path, next) {
  return setParts(value, parts(path), next);
}

/** @param {any} value @param {string[]} way @param {any} next @returns {any} */
function setParts(value, way, next) {
  if (way.length === 0) return next;
  const [first = '', ...rest] = way;
  if (first === '__proto__') throw new RangeError('not a path of a record');
  const copy = Array.isArray(value) ? [...value] : { ...(value ?? {}) };
  /** @type {any} */ (copy)[first] = setParts(/** @type {any} */ (copy)[first], rest, next);
  return copy;
}

/** @param {any} value @param {string} path of an array element @returns {any} */
export function removeAt(value, path) {
  const way = parts(path);
  const index = Number(way.pop());
  const listPath = way.map((part) => `/${part}`).join('');
  const list = getAt(value, listPath);
  return setAt(value, listPath, list.filter((/** @type {any} */ _, /** @type {number} */ i) => i !== index));
}

/** @param {string} path @param {string} start @returns {boolean} whether path is start or stands below it */
export function isUnder(path, start) {
  return path === start || path.startsWith(`${start}/`);
}
