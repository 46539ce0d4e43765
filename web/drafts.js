// Does what is being typed differ from what was entered? Texts only, compared as written.

/** @typedef {import('./types.js').Draft} Draft */
/** @typedef {import('./types.js').Quantity} Quantity */

/** @param {Draft|undefined} draft @param {Quantity|null|undefined} entered */
export function differs(draft, entered) {
  if (!draft) return false;
  if (draft.text.trim() === '') return Boolean(entered);
  if (!entered) return true;
  if (draft.unit !== (entered.unit || draft.unit)) return true; // a text may bring its unit and leave the field's own out
  return ['text', 'means', 'low', 'high'].some((key) => (/** @type {any} */ (draft)[key] ?? '') !== (/** @type {any} */ (entered)[key] ?? ''));
}

/** What the field starts from when a key is pressed. @param {Quantity|null|undefined} entered @param {string} unit @returns {Draft} */
export function draftOf(entered, unit) {
  if (!entered) return { text: '', unit };
  const { value, ...written } = entered;
  return { ...written, unit: entered.unit || unit };
}

/** @param {Draft} draft @returns {Quantity|null} what Next enters; null when the field was emptied */
export function quantityOf(draft) {
  const text = draft.text.trim();
  if (text === '') return null;
  /** @type {Quantity} */ const quantity = { text, unit: draft.unit };
  if (draft.means) quantity.means = draft.means;
  if (draft.means === 'stated') { quantity.low = draft.low ?? ''; quantity.high = draft.high ?? ''; }
  return quantity;
}

/** A unit key writes its unit behind the figure, in place of one that stands there. @param {string} text @param {string} unit @param {string[]} units */
export function withUnit(text, unit, units) {
  const trimmed = text.trimEnd();
  const present = [...units].sort((a, b) => b.length - a.length).find((one) => trimmed.endsWith(one) && !/[\p{L}]$/u.test(trimmed.slice(0, -one.length)));
  const bare = present ? trimmed.slice(0, -present.length).trimEnd() : trimmed;
  return bare === '' ? unit : `${bare} ${unit}`;
}

/** Put `key` where the caret stands. @param {string} text @param {number} start @param {number} end @param {string} key */
export function typed(text, start, end, key) {
  if (key === 'Backspace') {
    const from = start === end ? Math.max(0, start - 1) : start;
    return { text: text.slice(0, from) + text.slice(end), caret: from };
  }
  return { text: (text.slice(0, start) + key + text.slice(end)).slice(0, 40), caret: Math.min(40, start + key.length) };
}
