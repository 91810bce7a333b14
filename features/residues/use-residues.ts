import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { residues, type LocateReply, type Passport } from '@/shared/contracts/residues';
import { call } from '@/client/api';
import { liveQuery } from '@/client/live-query';
import { applyToLocated, applyToPassport } from './apply-residue-event';

const key = (projectId: string, ...rest: (string | number)[]) => ['project', projectId, 'residues', ...rest];
const typingRestMilliseconds = 150;

export const passportQuery = (projectId: string, proteinId: string, residueIndex: number) =>
  liveQuery<Passport>({
    projectId,
    queryKey: key(projectId, 'passport', proteinId, residueIndex),
    read: (signal) => call(residues.passport, { params: { projectId, proteinId, residueIndex }, signal }),
    apply: applyToPassport,
  });

export const locateQuery = (projectId: string, text: string) =>
  liveQuery<LocateReply>({
    projectId,
    queryKey: key(projectId, 'locate', text),
    read: (signal) => call(residues.locate, { params: { projectId }, query: { text }, signal }),
    apply: applyToLocated,
  });

/** Everything a residue is called. */
export function usePassport(projectId: string, proteinId: string, residueIndex: number) {
  return useQuery(passportQuery(projectId, proteinId, residueIndex));
}

/**
 * What a typed address can mean. Waits for a rest in typing; what was found last stays until there is something new.
 * `isBehind`: what is shown belongs to an earlier text.
 */
export function useLocate(projectId: string, typed: string) {
  const text = useRested(typed.trim());
  const query = useQuery({
    ...locateQuery(projectId, text),
    enabled: text !== '',
    placeholderData: keepPreviousData,
  });
  const data = text === '' || typed.trim() === '' ? undefined : query.data;
  return { ...query, data, isBehind: query.isPlaceholderData || text !== typed.trim() };
}

/** The value once it stopped changing for a moment; emptying it counts at once. */
function useRested(value: string): string {
  const [rested, setRested] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => setRested(value), value === '' ? 0 : typingRestMilliseconds);
    return () => clearTimeout(timer);
  }, [value]);
  return rested;
}
