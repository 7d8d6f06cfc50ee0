const form = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/i;

/** Whether PostgreSQL would take this text as a uuid; asking with anything else would be an error, not "no". */
export function isUUID(text: unknown): text is string {
  return typeof text === 'string' && form.test(text);
}
