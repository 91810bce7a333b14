import type { Request, RequestHandler } from 'express';
import multer, { type StorageEngine } from 'multer';
import { Refusal } from '../../lib/problem';
import type { FileStore, ReceivedFile } from '../../storage';

type UploadedFile = Express.Multer.File & ReceivedFile;

const longestFileName = 255;

/** The part of the form that holds the file. */
export const fileField = 'file';

/**
 * Reads the multipart form: the file goes to disk as it comes, hashed on the way, and never lies in memory. Whatever
 * happens afterwards, a temporary file that was not kept is removed when the reply has gone.
 */
export function receiveUpload(files: FileStore, limitBytes: number): RequestHandler {
  const storage: StorageEngine = {
    _handleFile: (_request, file, done) => {
      files.receive(file.stream).then(
        (received) => done(null, received as Partial<UploadedFile>),
        (error: unknown) => done(error),
      );
    },
    _removeFile: (_request, file, done) => {
      files.discard(file as UploadedFile).then(() => done(null), done);
    },
  };
  const read = multer({
    storage,
    defParamCharset: 'utf8',
    limits: {
      fileSize: limitBytes,
      files: 1,
      fields: 8,
      parts: 10,
      fieldSize: 2000,
      fieldNameSize: 40,
      headerPairs: 40,
      fieldNestingDepth: 1,
    },
  }).single(fileField);
  return (request, response, next) => {
    read(request, response, (error: unknown) => {
      const received = request.file as UploadedFile | undefined;
      if (received) {
        response.locals.fileHash = received.hash;
        // Kept files have moved away by then: there is nothing left to remove.
        response.once('close', () => void files.discard(received).catch(() => {}));
      }
      next(error ? readable(error, limitBytes) : undefined);
    });
  };
}

function readable(error: unknown, limitBytes: number): unknown {
  const { code, name } = (error ?? {}) as { code?: string; name?: string };
  if (code === 'LIMIT_FILE_SIZE') {
    const megabytes = Math.floor(limitBytes / 1024 / 1024);
    return new Refusal(413, 'file-too-large', 'Too large', `A file may have up to ${megabytes} MB here.`);
  }
  const isOfTheDisk = code === 'ENOSPC' || code === 'EACCES' || code === 'EMFILE' || code === 'EROFS';
  if (isOfTheDisk || (name !== 'MulterError' && !(error instanceof Error))) return error;
  return new Refusal(
    400,
    'bad-form',
    'Cannot be read',
    'The form is not as it should be, or was cut off: one file and its fields. Send it again.',
  );
}

/** The file of the form, with its name made harmless; refuses a form without one. */
export function fileOf(request: Request): ReceivedFile & { fileName: string } {
  const file = request.file as UploadedFile | undefined;
  if (!file) {
    throw new Refusal(400, 'file-missing', 'Cannot be read', 'Choose a file to upload.', {
      fields: [{ path: fileField, message: 'No file came with the form.' }],
    });
  }
  const { hash, bytes, temporaryPath } = file;
  return { hash, bytes, temporaryPath, fileName: cleanFileName(file.originalname) };
}

/** The last part of a path, on one line, without what cannot be seen. */
export function cleanFileName(name: string): string {
  const last = name.split(/[\\/]/).at(-1) ?? '';
  const visible = last.replace(/[\p{Cc}\p{Cf}\p{Cs}\u2028\u2029]/gu, '').trim();
  const characters = [...visible];
  // The end says what kind of file it is.
  const short =
    characters.length <= longestFileName
      ? visible
      : `${characters.slice(0, longestFileName - 21).join('')}…${characters.slice(-20).join('')}`;
  return /^\.*$/.test(short) ? 'file' : short;
}
