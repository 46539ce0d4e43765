// How is the newest record checked without an older answer ever standing for it? One question at a time; the newest wins.

/**
 * @param {{ask: (call:string, payload:any) => Promise<any>, now: () => string,
 *   onAnswer: (seq:number, stage:string, result:any) => void, onError: (seq:number, error:any) => void}} parts
 */
export function createChecking({ ask, now, onAnswer, onError }) {
  /** @type {{seq:number, record:any, again:boolean}|null} */ let wanted = null;
  let busy = false;

  /** @param {{seq:number, record:any, again:boolean}} job @param {string} stage */
  async function one(job, stage) {
    let result = await ask('check', { record: job.record, now: now(), stage, sliced: true });
    // Between slices the solver answers others; a check that nobody wants any more is not asked to go on.
    while (result.more && wanted === job) result = await ask('go_on', { token: result.more });
    if (wanted === job && !result.dropped) onAnswer(job.seq, stage, result);
  }

  async function run() {
    if (busy) return;
    busy = true;
    while (wanted) {
      const job = wanted;
      try {
        if (!job.again) await one(job, 'best');
        if (wanted === job) await one(job, 'full');
      } catch (error) {
        if (wanted === job) onError(job.seq, error);
      }
      if (wanted === job) wanted = null;
    }
    busy = false;
  }

  return {
    /** @param {number} seq @param {any} record */ want(seq, record) { wanted = { seq, record, again: false }; void run(); },
    /** The same record at a later time: its result may have lapsed. @param {number} seq @param {any} record */
    again(seq, record) { if (!wanted) { wanted = { seq, record, again: true }; void run(); } },
    forget() { wanted = null; },
  };
}
