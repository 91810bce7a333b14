import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import type { z } from 'zod';
import { uploads, type newUploadBody, type Upload } from '@/shared/contracts/uploads';
import { ActKeys } from '@/client/act-keys';
import { call } from '@/client/api';
import { liveProjects } from '@/client/live-projects';
import { liveQuery } from '@/client/live-query';
import { sendUpload, type UploadRequest } from '@/client/upload';
import { useOwnAct } from '@/client/use-act';
import { useUploadHints } from '@/client/use-live';
import { applyToUpload, applyToUploads, withHint } from './apply-upload-event';

const key = (projectId: string, ...rest: (string | number)[]) => ['project', projectId, 'uploads', ...rest];

export const uploadsQuery = (projectId: string) =>
  liveQuery<Upload[]>({
    projectId,
    queryKey: key(projectId),
    read: (signal) => call(uploads.list, { params: { projectId }, signal }),
    apply: applyToUploads,
  });

export const uploadQuery = (projectId: string, uploadId: string) =>
  liveQuery<Upload>({
    projectId,
    queryKey: key(projectId, uploadId),
    read: (signal) => call(uploads.read, { params: { projectId, uploadId }, signal }),
    apply: applyToUpload,
  });

/** The files of a project, with how far the ones being read are. */
export function useUploads(projectId: string) {
  const query = useQuery(uploadsQuery(projectId));
  const hints = useUploadHints(projectId);
  const data = useMemo(
    () => query.data?.map((upload) => withHint(upload, hints.get(upload.id))),
    [query.data, hints],
  );
  return { ...query, data };
}

export function useUpload(projectId: string, uploadId: string) {
  const query = useQuery(uploadQuery(projectId, uploadId));
  const hint = useUploadHints(projectId).get(uploadId);
  const data = useMemo(() => query.data && withHint(query.data, hint), [query.data, hint]);
  return { ...query, data };
}

/** The lines of the file around one that has an error. A file never changes. */
export function useExcerpt(projectId: string, uploadId: string, line: number | null, column?: number) {
  return useQuery({
    queryKey: key(projectId, uploadId, 'excerpt', line ?? 0, column ?? 1),
    queryFn: ({ signal }) =>
      call(uploads.excerpt, { params: { projectId, uploadId }, query: { line: line ?? 1, column }, signal }),
    enabled: line !== null,
    staleTime: Infinity,
  });
}

export interface MakeUpload {
  file: UploadRequest['file'];
  fields: z.input<typeof newUploadBody>;
}

/** Sends a file; `share` is how much of it left, 0 to 1, or null while nothing is known. */
export function useMakeUpload(projectId: string) {
  const client = useQueryClient();
  const [share, setShare] = useState<number | null>(null);
  const [keys] = useState(() => new ActKeys());
  const act = useOwnAct<MakeUpload, Upload>({
    async send({ file, fields }) {
      setShare(0);
      const { name, size, lastModified } = file;
      try {
        const idempotencyKey = keys.keyFor({ name, size, lastModified, fields });
        const made = await sendUpload({ projectId, file, fields, idempotencyKey, onProgress: setShare });
        keys.answered();
        return made;
      } catch (error) {
        keys.answered(error);
        throw error;
      }
    },
    take(payload) {
      // Its page begins with this and asks at once how it went on.
      const asOf = { updatedAt: 0 };
      client.setQueryData<Upload>(key(projectId, payload.id), (held) => held ?? payload, asOf);
      liveProjects.tell(projectId, [{ kind: 'upload.changed', payload }]);
    },
  });
  return { ...act, share };
}
