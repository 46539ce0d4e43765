// How is the newest record checked without an older answer ever standing for it? One question at a time; the newest wins.

/**
 * @param {{ask: (call:string, payload:any) => Promise<any>, now: () => string,
 *   onAnswer: (seq:number, stage:string, result:any) => void, onError: (seq:number, error:any) => void}} parts
 */
export function createChecking({ ask, now, onAnswer, onError }) {
  /** @type {{seq:number, record:any}|null} */ let wanted = null;
  let busy = false;

  /** @param {{seq:number, record:any}} job @param {string} stage */
  async function one(job, stage) {
    const result = await ask('check', { record: job.record, now: now(), stage });
    if (wanted === job) onAnswer(job.seq, stage, result);
  }

  async function run() {
    if (busy) return;
    busy = true;
    while (wanted) {
      const job = wanted;
      try {
        await one(job, 'best');
        if (wanted === job) await one(job, 'full');
      } catch (error) {
        if (wanted === job) onError(job.seq, error);
      }
      if (wanted === job) wanted = null;
    }
    busy = false;
  }

  return {
    /** @param {number} seq @param {any} record */ want(seq, record) { wanted = { seq, record }; void run(); },
    forget() { wanted = null; },
  };
}
