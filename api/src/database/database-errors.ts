/** Numbers MariaDB and MySQL give their errors; the driver's names for them differ between the two, the numbers do not. */
const DUPLICATE = 1062;
const GONE_NUMBERS = new Set([
  1040, // too many connections
  1053, // server shutdown in progress
  1205, // lock wait timeout
  1213, // deadlock
  1927, // connection was killed
]);

const ROLLED_BACK = new Set([1205, 1213]);

const GONE_CODES = new Set([
  "ECONNREFUSED",
  "ECONNRESET",
  "EPIPE",
  "ETIMEDOUT",
  "EHOSTUNREACH",
  "ENOTFOUND",
  "PROTOCOL_CONNECTION_LOST",
  "PROTOCOL_ENQUEUE_AFTER_FATAL_ERROR",
  "PROTOCOL_SEQUENCE_TIMEOUT",
]);

/** True where the database cannot be reached or asks to be tried again, so that the same request may succeed later. */
export function isDatabaseGone(error: unknown): boolean {
  const { code, errno, name, message } = partsOf(error);
  return (
    GONE_NUMBERS.has(errno) ||
    GONE_CODES.has(code) ||
    name === "KnexTimeoutError" ||
    // Said by the driver of a connection that broke while it lay in the pool; it carries no code.
    message.includes("in closed state")
  );
}

/** True where the database itself says that it has taken a transaction back. */
export const isRolledBack = (error: unknown): boolean => ROLLED_BACK.has(partsOf(error).errno);

/** True where the row would repeat a value of the named unique index. */
export function isDuplicate(error: unknown, index: string): boolean {
  const { errno, message } = partsOf(error);
  return errno === DUPLICATE && message.includes(index);
}

/** True for any error that comes from the database: its message may hold what people typed. */
export function isDatabaseError(error: unknown): boolean {
  return isDatabaseGone(error) || "sqlMessage" in Object(error);
}

function partsOf(error: unknown) {
  const { code, errno, name, message } = Object(error) as Record<string, unknown>;
  return { code: String(code), errno: Number(errno), name: String(name), message: String(message) };
}
