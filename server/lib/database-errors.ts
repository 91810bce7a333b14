/** Deadlock, lock wait, and (from MariaDB 11.6) a row changed after one's snapshot: the whole unit runs again. */
const retryable = new Set([1213, 1205, 1020]);
const lost = new Set([
  'PROTOCOL_CONNECTION_LOST',
  'ECONNRESET',
  'ECONNREFUSED',
  'EPIPE',
  'ETIMEDOUT',
  'ER_SERVER_SHUTDOWN',
  'POOL_CLOSED',
]);

interface DriverError {
  errno?: number;
  code?: string;
  driverError?: DriverError;
  message?: string;
}

function driverError(error: unknown): DriverError {
  const outer = (error ?? {}) as DriverError;
  return outer.driverError ?? outer;
}

export const isRetryable = (error: unknown): boolean => retryable.has(driverError(error).errno ?? 0);

export function isConnectionLost(error: unknown): boolean {
  const { code, message } = driverError(error);
  return (
    lost.has(code ?? '') ||
    /closed state|pool is closed|pool does not exist|connection.*(lost|closed)/i.test(message ?? '')
  );
}

export const isDuplicate = (error: unknown): boolean => driverError(error).errno === 1062;
