// How do the screens write markup? htm over preact: every value becomes a text node or an attribute, never markup.
import htm from '../vendor/htm.js';
import { h } from '../vendor/preact.js';

export const html = htm.bind(h);

/** @param {(string|false|null|undefined)[]} names */
export const classes = (...names) => names.filter(Boolean).join(' ');
