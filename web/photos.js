// How does a picture taken on site become evidence? Its bytes are kept as they came and named by their SHA-256.

export const MAX_PHOTO = 30_000_000;
const KINDS = ['image/jpeg', 'image/png', 'image/webp', 'image/heic', 'image/heif', 'image/avif'];

/** @param {ArrayBuffer} bytes @returns {Promise<string>} */
export async function sha256(bytes) {
  const digest = await crypto.subtle.digest('SHA-256', bytes);
  return [...new Uint8Array(digest)].map((byte) => byte.toString(16).padStart(2, '0')).join('');
}

/** @param {File} file @returns {string|null} why it can't be taken in */
export function photoRefusal(file) {
  if (!KINDS.includes(file.type)) return `“${file.name}” is no photo that can be shown (${file.type || 'kind unknown'}). Take a JPEG, PNG, WebP or HEIC picture.`;
  if (file.size > MAX_PHOTO) return `“${file.name}” has ${Math.round(file.size / 1e6)} MB; ${MAX_PHOTO / 1e6} MB is the most. Take it with a smaller picture size.`;
  return null;
}

/** @param {any} record @param {{hash:string, name:string, type:string, bytes:number, load:string|null, taken:string}} photo */
export function withPhoto(record, photo) {
  if (record.photos.some((/** @type {any} */ one) => one.hash === photo.hash && one.load === photo.load)) return record;
  const loads = record.loads.map((/** @type {any} */ load) => (load.id === photo.load ? { ...load, photos: [...load.photos, photo.hash] } : load));
  return { ...record, loads, photos: [...record.photos, { ...photo, note: '' }] };
}

/** @param {any} record @param {number} index */
export function withoutPhoto(record, index) {
  const gone = record.photos[index];
  const loads = record.loads.map((/** @type {any} */ load) => (
    load.id === gone.load ? { ...load, photos: load.photos.filter((/** @type {string} */ hash) => hash !== gone.hash) } : load));
  return { ...record, loads, photos: record.photos.filter((/** @type {any} */ _, /** @type {number} */ i) => i !== index) };
}
