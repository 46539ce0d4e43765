// How does the page start? The controller knows all parts; nothing else is done here.
import { startController } from './controller.js';
import { mountApp } from './ui/app.js';

const controller = startController();
mountApp(/** @type {HTMLElement} */ (document.getElementById('app')), controller);
