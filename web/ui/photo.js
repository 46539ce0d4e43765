// How is a photo taken, kept and seen again beside the load it shows?
import { useEffect, useState } from '../vendor/preact-hooks.js';
import { html } from './html.js';

/** @typedef {import('../controller.js').Controller} Controller */

/** @param {{controller: Controller, field: import('../types.js').Field}} props */
export function PhotoField({ controller, field }) {
  const { state, editing } = controller;
  const load = field.load ?? '';
  const mine = (state.record.value?.photos ?? []).map((/** @type {any} */ photo, /** @type {number} */ i) => ({ photo, i })).filter((/** @type {any} */ one) => (one.photo.load ?? '') === load);
  const take = (/** @type {any} */ event) => {
    const file = event.currentTarget.files?.[0];
    event.currentTarget.value = '';
    if (file) { void editing.addPhoto(file, load).catch(controller.fail); void controller.persist(); }
  };
  const words = field.name.replace(/, photo$/, '');
  return html`<div class="field photo-field">
    ${mine.map((/** @type {any} */ one) => html`<${PhotoRow} key=${one.photo.hash} controller=${controller} photo=${one.photo} at=${one.i} load=${load} words=${words} />`)}
    <label class="key file-key">${mine.length ? 'Take another photo' : 'Take a photo'}<input type="file" aria-label=${`${words}, take a photo`} accept="image/*" capture="environment" disabled=${Boolean(state.readOnly.value)} onChange=${take} /></label>
  </div>`;
}

/** @param {{controller: Controller, photo:any, at:number, load:string, words:string}} props */
function PhotoRow({ controller, photo, at, load, words }) {
  const note = { kind: /** @type {const} */ ('text'), path: `/photos/${at}/note`, label: 'Note on the photo', name: `${words}, note on the photo` };
  return html`<figure class="photo"><${Picture} controller=${controller} hash=${photo.hash} label=${photo.note || photo.name || 'Photo'} />
    <figcaption><label>Note on the photo<input type="text" maxlength="500" aria-label=${note.name} value=${photo.note} onChange=${(/** @type {any} */ event) => { void controller.editing.answer(note, event.currentTarget.value); }} /></label>
      <small>${photo.taken ? `${photo.taken.slice(0, 16).replace('T', ' ')}; ` : ''}sha256 ${photo.hash.slice(0, 12)}…</small>
      <button class="key key-remove" aria-label=${`${words}, remove the photo`} onClick=${() => { void controller.editing.removePhoto(photo.hash, load); }}>Remove photo</button></figcaption></figure>`;
}

/** @param {{controller: Controller, hash:string, label:string}} props */
export function Picture({ controller, hash, label }) {
  const [url, setUrl] = useState(/** @type {string|null|undefined} */ (undefined));
  useEffect(() => {
    let made = '';
    let gone = false;
    void controller.photo(hash).then((/** @type {Blob|undefined} */ blob) => {
      if (gone) return;
      made = blob ? URL.createObjectURL(blob) : '';
      setUrl(made || null);
    });
    return () => { gone = true; if (made) URL.revokeObjectURL(made); };
  }, [hash]);
  if (url === null) return html`<p class="photo-absent">This photo is not on this device; only its hash came with the record.</p>`;
  return url ? html`<img class="photo-picture" src=${url} alt=${label} />` : html`<p class="photo-absent">Photo is being fetched.</p>`;
}
