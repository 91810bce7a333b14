import type { Upload } from '@/shared/contracts/uploads';

/** `an error`, `5 errors`; a long list is cut, and its length is then only the least there are. */
export function errorWords(issues: Upload['issues']): string {
  const errors = issues.filter(({ severity, code }) => severity === 'error' && code !== 'more-issues').length;
  const isCut = issues.some(({ code }) => code === 'more-issues');
  if (errors === 1) return isCut ? 'an error, and more' : 'an error';
  return isCut ? `${errors} errors or more` : `${errors} errors`;
}
