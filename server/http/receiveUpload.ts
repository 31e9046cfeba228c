import type { Request, Response } from 'express';
import multer from 'multer';
import { invalid, malformed, ProblemError, tooLarge, unsupported } from './problem.ts';
import type { UploadedFile } from './defineRoute.ts';

export type Upload = { file: UploadedFile; fields: Record<string, string> };

const tooLargeCodes: Record<string, string> = {
  LIMIT_FILE_SIZE: 'The file is larger than this call takes.',
  LIMIT_FIELD_VALUE: 'A form field is larger than 16 kB.',
  LIMIT_PART_COUNT: 'The form has too many parts: send one file and the mapping.',
  LIMIT_FILE_COUNT: 'Send one file.',
  LIMIT_FIELD_COUNT: 'The form has too many fields.',
};

/**
 * Reads one `file` and the named text fields of a multipart form into memory, within bounds.
 * Called only after the caller was allowed to upload.
 *
 * @throws ProblemError 400, 413, 415 or 422
 */
export async function receiveUpload(
  request: Request,
  response: Response,
  options: { maxBytes: number; fields: string[] },
): Promise<Upload> {
  if (request.is('multipart/form-data') === false) {
    throw unsupported('Send the file as multipart/form-data in the field "file".');
  }
  const receive = multer({
    storage: multer.memoryStorage(),
    defParamCharset: 'utf8',
    limits: {
      fileSize: options.maxBytes,
      files: 1,
      fields: options.fields.length,
      parts: options.fields.length + 1,
      fieldSize: 16 * 1024,
      fieldNameSize: 100,
      headerPairs: 20,
    },
  }).single('file');
  await new Promise<void>((resolve, reject) => {
    receive(request, response, (error: unknown) =>
      error === undefined || error === null ? resolve() : reject(asProblem(error)),
    );
  });
  const file = request.file;
  if (file === undefined) {
    throw invalid([{ path: 'file', message: 'is missing: send the log in the field "file"' }]);
  }
  const fields: Record<string, string> = {};
  for (const [name, value] of Object.entries((request.body ?? {}) as Record<string, unknown>)) {
    if (!options.fields.includes(name) || typeof value !== 'string') {
      throw invalid([{ path: name.slice(0, 100), message: 'is not a field of this form' }]);
    }
    fields[name] = value;
  }
  return { file: { name: cleanName(file.originalname), bytes: file.buffer }, fields };
}

function asProblem(error: unknown): Error {
  if (error instanceof multer.MulterError) {
    const text = tooLargeCodes[error.code];
    if (text !== undefined) return tooLarge(text);
    return malformed(`The form could not be read: ${error.message}.`);
  }
  if (error instanceof ProblemError) return error;
  return malformed('The form ended early or could not be read. Nothing was stored; send it again.');
}

/** A file name is a label: no folders, no control or direction marks, at most 200 characters. */
export function cleanName(name: string): string {
  const last = name.split(/[\\/]/).pop() ?? '';
  const clean = last.replace(/[\p{Cc}\p{Cf}\u2028\u2029]/gu, '').trim();
  return [...clean].slice(0, 200).join('') || 'log';
}
