// How are whole checks made, kept, taken away and brought back, one or all at once?
import { BundleError, packBundle, planImport, unpackBundle } from './bundle.js';
import { isoWithZone, newRecord } from './changes.js';

/** @typedef {import('./types.js').Entry} Entry */

/** @param {{state: import('./state.js').State, storage: () => import('./storage.js').Storage, ask: (call:string, payload:any) => Promise<any>, savePreferences: (patch:any) => Promise<void>}} parts */
export function createLibrary({ state, storage, ask, savePreferences }) {
  const now = () => isoWithZone(new Date());

  async function refresh() { state.checks.value = await storage().checks(); }

  /** @param {any} record @param {string} [origin] @returns {Promise<string>} its id */
  async function keep(record, origin) {
    /** @type {Entry} */ const entry = { id: record.id, record, seq: 0, exported: null, deleted: null };
    if (origin) entry.origin = origin;
    await storage().putCheck(entry);
    await refresh();
    return record.id;
  }

  /** @param {any} record @returns {any} the same answers as a check of its own */
  const asNew = (record) => ({ ...structuredClone(record), id: crypto.randomUUID(), created: now(), changed: now(), decision: null });
  const create = () => keep(newRecord(state.words.value.blank ?? null, state.preferences.value, new Date()));

  /** @param {string} id */
  async function duplicate(id) {
    const entry = await storage().check(id);
    if (!entry) return;
    const copy = asNew(entry.record);
    copy.condition = structuredClone(newRecord(null, state.preferences.value, new Date()).condition); // a look is never copied
    copy.found_at = null;
    await keep(copy, 'copy; its look must be answered again');
  }

  async function demo() {
    const { record } = await ask('demo', {});
    return keep({ ...asNew(record), found_at: record.found_at ?? now() }, 'demonstration, invented');
  }

  /** @param {string} id @param {boolean} gone */
  async function setDeleted(id, gone) {
    const entry = await storage().check(id);
    if (!entry) return;
    await storage().putCheck({ ...entry, deleted: gone ? now() : null });
    await refresh();
    state.notice.value = gone ? { text: 'Check deleted.', undo: () => { void setDeleted(id, false); }, undoLabel: 'Undo delete' } : null;
  }

  /** @param {string} id */
  async function purge(id) { await storage().purge(id); await refresh(); }

  async function exportAll() {
    const all = (await storage().checks()).filter((entry) => !entry.deleted);
    /** @type {Map<string, Uint8Array>} */ const photos = new Map();
    for (const hash of new Set(all.flatMap((entry) => entry.record.photos.map((/** @type {any} */ photo) => photo.hash)))) {
      const blob = await storage().photo(hash);
      if (blob) photos.set(hash, new Uint8Array(await blob.arrayBuffer()));
    }
    const stamp = now();
    download(new Blob([packBundle(all, photos, stamp)], { type: 'application/zip' }), `asfound-${stamp.slice(0, 16).replace(/[:T]/g, '-')}.zip`);
    await savePreferences({ exported: stamp });
    state.notice.value = { text: `${count(all.length, 'check')} and ${count(photos.size, 'photo')} handed to the browser as a file. Look that it arrived.` };
  }

  /** @param {File} file */
  async function importFile(file) {
    try {
      const { records, photos, refused } = await unpackBundle(new Uint8Array(await file.arrayBuffer()));
      const plan = planImport(await storage().checks(), records, () => crypto.randomUUID());
      const types = new Map(records.flatMap((record) => record.photos.map((/** @type {any} */ photo) => [photo.hash, photo.type])));
      const present = new Set(await storage().photoHashes());
      const blobs = photos.filter((photo) => types.has(photo.hash) && !present.has(photo.hash)).map((photo) => ({ hash: photo.hash, blob: new Blob([photo.bytes], { type: imageType(types.get(photo.hash)) }) }));
      await storage().addAll(plan.add, blobs);
      await refresh();
      const beside = plan.beside ? ` ${count(plan.beside, 'of them', 'of them')} differed from a check here: both are kept.` : '';
      const same = plan.same ? ` ${count(plan.same, 'check')} already here in the same words.` : '';
      state.notice.value = { text: `${count(plan.add.length, 'check')} and ${count(blobs.length, 'photo')} taken in.${beside}${same} ${refused.join(' ')}`.trim() };
    } catch (error) {
      if (!(error instanceof BundleError)) throw error;
      state.notice.value = { text: error.message };
    }
  }

  return { refresh, keep, asNew, create, duplicate, demo, setDeleted, purge, exportAll, importFile };
}

/** A stranger's file must not make the browser treat a picture as a page. @param {unknown} type */
const imageType = (type) => (/^image\/(jpeg|png|webp|heic|heif|avif)$/.test(String(type)) ? String(type) : 'image/jpeg');

/** @param {number} n @param {string} one @param {string} [many] */
const count = (n, one, many = `${one}s`) => `${n} ${n === 1 ? one : many}`;

/** @param {Blob} blob @param {string} name */
function download(blob, name) {
  const link = document.createElement('a');
  link.href = URL.createObjectURL(blob);
  link.download = name;
  link.click();
  setTimeout(() => URL.revokeObjectURL(link.href), 60_000);
}
