// Where do checks, drafts, photos and preferences live? In IndexedDB; every write is awaited until its transaction is complete.
import { openDB } from './vendor/idb.js';

/** @typedef {import('./types.js').Entry} Entry */
/** @typedef {import('./types.js').Draft} Draft */

const STORES = ['checks', 'drafts', 'photos', 'kept'];
/** @type {{durability: 'strict'}} A commit is on disk, not only on its way, before the next one. */
const STRICT = { durability: 'strict' };

/** Another tab wrote this check since it was read here. */
export class Conflict extends Error {}

/** @returns {Promise<Storage>} */
export async function openStorage() {
  const database = await openDB('asfound', 1, {
    upgrade(/** @type {any} */ fresh) { for (const name of STORES) fresh.createObjectStore(name); },
  });
  return new Storage(database);
}

export class Storage {
  /** @param {any} database */
  constructor(database) { this.database = database; }

  /** @returns {Promise<Entry[]>} newest change first */
  async checks() {
    const all = await this.database.getAll('checks');
    return all.sort((/** @type {Entry} */ a, /** @type {Entry} */ b) => (a.record.changed < b.record.changed ? 1 : -1));
  }

  /** @param {string} id @returns {Promise<Entry|undefined>} */
  async check(id) { return this.database.get('checks', id); }

  /** Write one check if nobody else has since `entry.seq`. @param {Entry} entry @returns {Promise<Entry>} as stored */
  async putCheck(entry) {
    const transaction = this.database.transaction('checks', 'readwrite', STRICT);
    const stored = await transaction.store.get(entry.id);
    if (stored && stored.seq !== entry.seq) { await transaction.done; throw new Conflict(); }
    const next = { ...entry, seq: entry.seq + 1 };
    transaction.store.put(next, entry.id);
    await transaction.done;
    return next;
  }

  /** Several new checks and photos together, or none of them. @param {Entry[]} entries @param {{hash:string, blob:Blob}[]} photos */
  async addAll(entries, photos) {
    const transaction = this.database.transaction(['checks', 'photos'], 'readwrite', STRICT);
    for (const entry of entries) transaction.objectStore('checks').add(entry, entry.id);
    for (const photo of photos) transaction.objectStore('photos').put(photo, photo.hash);
    await transaction.done;
  }

  /** For good. @param {string} id */
  async purge(id) {
    const transaction = this.database.transaction(['checks', 'drafts', 'photos'], 'readwrite', STRICT);
    transaction.objectStore('checks').delete(id);
    transaction.objectStore('drafts').delete(draftRange(id));
    const left = await transaction.objectStore('checks').getAll();
    const used = new Set(left.filter((/** @type {Entry} */ one) => one.id !== id).flatMap((/** @type {Entry} */ one) => one.record.photos.map((/** @type {any} */ p) => p.hash)));
    for (const hash of await transaction.objectStore('photos').getAllKeys()) if (!used.has(hash)) transaction.objectStore('photos').delete(hash);
    await transaction.done;
  }

  /** @param {string} id @returns {Promise<Record<string, Draft>>} by path */
  async drafts(id) {
    const [keys, values] = await Promise.all([this.database.getAllKeys('drafts', draftRange(id)), this.database.getAll('drafts', draftRange(id))]);
    return Object.fromEntries(keys.map((/** @type {any} */ key, /** @type {number} */ i) => [key[1], values[i]]));
  }

  /** @param {string} id @param {string} path @param {Draft|null} draft null forgets it */
  async putDraft(id, path, draft) {
    const transaction = this.database.transaction('drafts', 'readwrite');
    if (draft) transaction.store.put(draft, [id, path]); else transaction.store.delete([id, path]);
    await transaction.done;
  }

  /** @param {string} hash @param {Blob} blob */
  async putPhoto(hash, blob) {
    const transaction = this.database.transaction('photos', 'readwrite', STRICT);
    transaction.store.put({ hash, blob }, hash);
    await transaction.done;
  }

  /** @param {string} hash @returns {Promise<Blob|undefined>} */
  async photo(hash) { return (await this.database.get('photos', hash))?.blob; }

  /** @returns {Promise<string[]>} */
  async photoHashes() { return this.database.getAllKeys('photos'); }

  /** @param {string} key */
  async kept(key) { return this.database.get('kept', key); }

  /** @param {string} key @param {any} value */
  async keep(key, value) {
    const transaction = this.database.transaction('kept', 'readwrite', STRICT);
    transaction.store.put(value, key);
    await transaction.done;
  }
}

/** @param {string} id */
const draftRange = (id) => IDBKeyRange.bound([id], [id, []]);
