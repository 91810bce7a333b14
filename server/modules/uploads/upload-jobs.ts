/** Which job reads which kind of upload. */
export const uploadJobKinds = { alignment: 'alignment.read', structure: 'structure.read' } as const;
/** Under this key an upload has one job, ever. */
export const uploadJobKey = (uploadId: string): string => `upload:${uploadId}`;
