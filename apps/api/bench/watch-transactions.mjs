// Loaded before the API by the measurement of checkout: notes how many statements each transaction that makes an
// order sends, and how long it takes from BEGIN to the answer of COMMIT.
import pg from 'pg';

const running = new WeakMap();
const { query } = pg.Client.prototype;

pg.Client.prototype.query = function watched(config, values, callback) {
  const text = typeof config === 'string' ? config : (config?.text ?? '');
  if (/^\s*(BEGIN|START TRANSACTION)/i.test(text))
    running.set(this, { start: performance.now(), n: 0, order: false });
  const open = running.get(this);
  if (open) {
    open.n += 1;
    if (/INSERT INTO "?orders"?/i.test(text)) open.order = true;
  }
  const ended = open && /^\s*(COMMIT|ROLLBACK)/i.test(text) ? open : null;
  if (ended) running.delete(this);
  const note = () => {
    if (ended?.order && /COMMIT/i.test(text))
      process.send?.({ statements: ended.n, ms: performance.now() - ended.start });
  };
  if (typeof values === 'function') return query.call(this, config, (...given) => (note(), values(...given)));
  if (typeof callback === 'function')
    return query.call(this, config, values, (...given) => (note(), callback(...given)));
  const answer = query.call(this, config, values);
  answer?.then?.(note, () => undefined);
  return answer;
};
