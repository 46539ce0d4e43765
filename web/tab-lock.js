// Which of two tabs may write a check? The one that opened it last; the other is told when it loses the lock.

/** @param {() => void} onLost */
export function createTabLock(onLost) {
  /** @type {(() => void)|null} */ let letGo = null;
  let turn = 0;
  return {
    /** @param {string} id */
    async take(id) {
      if (!navigator.locks) return; // the sequence number in storage still refuses an overwrite
      turn += 1;
      const mine = turn;
      try {
        await navigator.locks.request(`asfound-check-${id}`, { steal: true }, () => new Promise((resolve) => { letGo = () => resolve(undefined); }));
      } catch {
        if (mine === turn) onLost();
      }
    },
    release() { turn += 1; letGo?.(); letGo = null; },
  };
}
