// What does the page know at this moment? Signals only; the controller writes them, the screens read them.
import { computed, signal } from './vendor/signals.js';
import { FIRST_WORDS } from './first-words.js';
import { differs } from './drafts.js';
import { getAt } from './pointer.js';
import { stations } from './stations.js';

/** @typedef {import('./types.js').Entry} Entry */
/** @typedef {import('./types.js').Draft} Draft */
/** @typedef {{name:'list'|'check'|'settings'|'share'|'opened'|'about', id?:string, at?:string, all?:boolean}} Screen */

/** @type {import('./types.js').Preferences} */
export const DEFAULTS = { display: 'metric', phone: '', name: '', light: 'auto', large: false, pad: 'touch', exported: null };

export function createState() {
  const words = signal(/** @type {import('./types.js').Hello} */ (FIRST_WORDS));
  const entry = signal(/** @type {Entry|null} */ (null));
  const drafts = signal(/** @type {Record<string, Draft>} */ ({}));
  const answer = signal(/** @type {{seq:number, stage:string, result:any}|null} */ (null));
  const screen = signal(/** @type {Screen} */ ({ name: 'list' }));
  const record = computed(() => entry.value?.record ?? null);
  const current = computed(() => (answer.value && entry.value && answer.value.seq === entry.value.seq ? answer.value.result : null));
  const readOnly = signal('');
  const walk = computed(() => (record.value ? stations(record.value, words.value) : []));
  return {
    words, entry, drafts, answer, screen, record, walk,
    /** checks in the list, deleted ones too */ checks: signal(/** @type {Entry[]} */ ([])),
    preferences: signal(DEFAULTS),
    /** the number field that the pad writes into */ focus: signal(/** @type {string|null} */ (null)),
    padUp: signal(false),
    /** which text of the number the pad writes: itself, or its stated low or high */ padPart: signal(/** @type {'text'|'low'|'high'} */ ('text')),
    /** asked on the pad's place after Next */ meansFor: signal(/** @type {string|null} */ (null)),
    reading: signal(/** @type {{path:string, text:string, shown?:string, also?:string, error?:string}|null} */ (null)),
    solver: signal(/** @type {{state:'starting'|'ready'|'failed', label:string, loaded:number, total:number, message:string}} */ (
      { state: 'starting', label: 'The solver is starting.', loaded: 0, total: 0, message: '' })),
    offline: signal(/** @type {{state:string, message:string, done:number, total:number}} */ ({ state: 'checking', message: '', done: 0, total: 0 })),
    missing: signal(/** @type {string[]} */ ([])),
    /** one sentence at the foot of the page */ notice: signal(/** @type {{text:string, undo?:()=>void, undoLabel?:string}|null} */ (null)),
    undo: signal(/** @type {{record:any, label:string}[]} */ ([])),
    readOnly, persisted: signal(/** @type {boolean|null} */ (null)),
    opened: signal(/** @type {any} */ (null)), shared: signal(/** @type {any} */ (null)), failure: signal(''),
    typing: computed(() => Object.keys(drafts.value).filter((path) => differs(drafts.value[path], getAt(record.value, path)))),
    /** the result that stands for the record as it is now */ current,
    /** people must go away from the beam, and nobody was told yet */
    clearing: computed(() => screen.value.name === 'check' && Boolean(current.value?.clear_area) && !record.value?.condition.told && !readOnly.value),
  };
}
/** @typedef {ReturnType<typeof createState>} State */
