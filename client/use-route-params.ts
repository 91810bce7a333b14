import { useLocalSearchParams } from 'expo-router';
import { useMemo } from 'react';
import type { z } from 'zod';

/**
 * What the address says, read through the schema of a contract; null when it is no address of this kind. Anything
 * else in the address is left alone.
 */
export function useRouteParams<Schema extends z.ZodObject>(schema: Schema): z.output<Schema> | null {
  const given = useLocalSearchParams();
  // The router gives a new object at each drawing.
  const text = JSON.stringify(Object.keys(schema.shape).map((name) => [name, given[name]]));
  return useMemo(() => {
    const pairs = JSON.parse(text) as [string, unknown][];
    const known = Object.fromEntries(pairs.filter(([, value]) => value !== undefined && value !== null));
    const parsed = schema.safeParse(known);
    return parsed.success ? parsed.data : null;
  }, [schema, text]);
}
