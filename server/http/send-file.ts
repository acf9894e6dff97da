import type { Response } from 'express';
import type { FileAnswer } from '#shared/contracts/contract.ts';
import type { FileContent } from './handler.ts';

/** Sends a download under its name. */
export function sendFile(res: Response, kind: FileAnswer, file: FileContent): void {
  res.attachment(file.filename);
  res.type(kind.file);
  res.send(typeof file.content === 'string' ? file.content : Buffer.from(file.content));
}
