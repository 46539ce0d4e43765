// Which checks are stored here, and what can be done with them?
import { html } from './html.js';
import { OfflineStanding, SolverStanding } from './standing.js';

/** @typedef {import('../controller.js').Controller} Controller */
/** @typedef {import('../types.js').Entry} Entry */

/** @param {{controller: Controller}} props */
export function ListScreen({ controller }) {
  const { checks, solver } = controller.state;
  const kept = checks.value.filter((one) => !one.deleted);
  const deleted = checks.value.filter((one) => one.deleted);
  const noSolver = solver.value.state !== 'ready';
  const demo = () => controller.library.demo().then((id) => controller.show({ name: 'check', id, at: '/result' })).catch(controller.fail);
  return html`<main class="page list-page">
    <header class="title-block">
      <h1>Asfound</h1><p>A beam as found, against its designer’s limits.</p>
      <button class="key" onClick=${() => controller.show({ name: 'settings' })}>Settings</button>
    </header>
    <${SolverStanding} controller=${controller} />
    ${controller.sharing.fragment() && html`<p class="standing">The address still holds a link to a check. <button class="key" onClick=${() => controller.show({ name: 'opened' })}>Read the link</button></p>`}
    <div class="first-keys">
      <button class="key key-main" onClick=${() => { void controller.create().catch(controller.fail); }}>New check</button>
      <button class="key" aria-disabled=${noSolver} onClick=${() => { if (!noSolver) void demo(); else controller.state.notice.value = { text: 'The demonstration comes from the solver, which has not started yet.' }; }}>Demonstration check</button>
    </div>
    <h2>Checks on this device</h2>
    ${kept.length === 0 && html`<p class="quiet">None yet. A check takes about three minutes from nothing, one minute from a design link.</p>`}
    <ul class="checks">${kept.map((entry) => html`<${CheckRow} key=${entry.id} controller=${controller} entry=${entry} title=${numbered(kept, entry)} />`)}</ul>
    ${deleted.length > 0 && html`<details class="deleted"><summary>Deleted checks (${deleted.length})</summary>
      <ul class="checks">${deleted.map((entry) => html`<${DeletedRow} key=${entry.id} controller=${controller} entry=${entry} />`)}</ul></details>`}
    <${Keeping} controller=${controller} kept=${kept} />
    <footer class="foot"><${OfflineStanding} controller=${controller} />
      <p><button class="key" onClick=${() => controller.show({ name: 'about' })}>What this tool does not do, notices and licences</button></p>
      <p class="quiet">Version ${controller.state.words.value.versions?.asfound ?? 'known once the solver has started'}. A record and a comparison: no approval, no permit and no design.</p></footer>
  </main>`;
}

/** @param {Entry} entry @returns {string} */
export const titleOf = (entry) => entry.record.place.member || 'Member not named';
/** @param {any} record */
export const endsOf = (record) => (record.ends.left || record.ends.right ? `${record.ends.left || '?'} – ${record.ends.right || '?'}` : record.place.site || 'ends not named');
/** @param {string} iso */
export const shownTime = (iso) => (iso ? iso.slice(0, 16).replace('T', ' ') : '');

/** Checks of the same member are told apart by number, oldest first. @param {Entry[]} all @param {Entry} entry */
function numbered(all, entry) {
  const same = all.filter((one) => titleOf(one) === titleOf(entry)).sort((a, b) => (a.record.created < b.record.created ? -1 : 1));
  return same.length > 1 ? `${titleOf(entry)} (${same.indexOf(entry) + 1})` : titleOf(entry);
}

/** @param {{controller: Controller, entry: Entry, title: string}} props */
function CheckRow({ controller, entry, title }) {
  const { record, id } = entry;
  return html`<li class="check-row">
    <button class="check-open" aria-label=${`Open ${title}, ${endsOf(record)}`} onClick=${() => controller.show({ name: 'check', id, at: '/place' })}>
      <b>${title}</b> <span>${endsOf(record)}</span></button>
    <small class="check-when">changed ${shownTime(record.changed)}${entry.origin ? `; ${entry.origin}` : ''}</small>
    <div class="row-keys"><button class="key" aria-label=${`Duplicate ${title}`} onClick=${() => { void controller.library.duplicate(id).catch(controller.fail); }}>Duplicate</button>
      <button class="key" aria-label=${`Delete ${title}`} onClick=${() => { void controller.library.setDeleted(id, true).catch(controller.fail); }}>Delete</button></div>
  </li>`;
}

/** @param {{controller: Controller, entry: Entry}} props */
function DeletedRow({ controller, entry }) {
  const title = titleOf(entry);
  return html`<li class="check-row"><p class="check-open"><b>${title}</b><span>${endsOf(entry.record)}</span><small>deleted ${shownTime(entry.deleted ?? '')}</small></p>
    <div class="row-keys"><button class="key" aria-label=${`Bring back ${title}`} onClick=${() => { void controller.library.setDeleted(entry.id, false).catch(controller.fail); }}>Bring back</button>
      <button class="key" aria-label=${`Remove ${title} for good`} onClick=${() => { void controller.library.purge(entry.id).catch(controller.fail); }}>Remove for good</button></div></li>`;
}

/** Export, import and how well the browser keeps what is here. @param {{controller: Controller, kept: Entry[]}} props */
function Keeping({ controller, kept }) {
  const { preferences, persisted } = controller.state;
  const exported = preferences.value.exported;
  const changed = kept.filter((entry) => !exported || entry.record.changed > exported).length;
  const take = (/** @type {any} */ event) => {
    const file = event.currentTarget.files?.[0];
    event.currentTarget.value = '';
    if (file) void controller.library.importFile(file).catch(controller.fail);
  };
  return html`<section class="keeping" aria-label="Keeping">
    <h2>Keeping</h2>
    <p>${exported ? `Last exported ${shownTime(exported)}.` : 'Never exported.'} ${changed ? `${changed} ${changed === 1 ? 'check is' : 'checks are'} in this browser only.` : kept.length ? 'Nothing changed since.' : ''}</p>
    <div class="first-keys"><button class="key" onClick=${() => { void controller.library.exportAll().catch(controller.fail); }}>Export all</button>
      <label class="key file-key">Import all<input type="file" aria-label="Import all" accept=".zip,application/zip" onChange=${take} /></label></div>
    ${persisted.value === false && html`<p>The browser may clear this storage when space runs short. <button class="key" onClick=${controller.persist}>Ask it to keep everything</button></p>`}
    ${persisted.value === true && html`<p class="quiet">The browser has agreed to keep this storage.</p>`}
  </section>`;
}
