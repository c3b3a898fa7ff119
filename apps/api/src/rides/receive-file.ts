import { MAX_IMPORT_BYTES } from '@halfpitch/contracts';
import type { NextFunction, Request, Response } from 'express';
import multer, { MulterError } from 'multer';
import { ProblemException } from '../common/problems';

const upload = multer({
  storage: multer.memoryStorage(),
  limits: { fileSize: MAX_IMPORT_BYTES, files: 1, fields: 10, fieldSize: 10_000 },
  defParamCharset: 'utf8',
}).single('file');

function problem(error: unknown): ProblemException {
  if (!(error instanceof MulterError))
    return new ProblemException(
      400,
      'Please check what you entered',
      'The upload broke off. Send the file again.',
    );
  if (error.code === 'LIMIT_FILE_SIZE')
    return new ProblemException(
      413,
      'Too large',
      `The file is larger than ${MAX_IMPORT_BYTES / 1024 / 1024} MB. Split it, or pack it as .zip or .gz.`,
    );
  return new ProblemException(400, 'Please check what you entered', 'Send one file in the field “file”.');
}

/**
 * Receives one file into memory before the request's transaction begins, so that a slow upload holds no connection to
 * the database. Of who is not signed in nothing is read.
 */
export function receiveFile(request: Request, response: Response, next: NextFunction): void {
  if (!request.user) return next();
  upload(request, response, (error: unknown) => next(error ? problem(error) : undefined));
}
