import type { Response } from 'express';
import type { FileAnswer } from '#shared/contracts/contract.ts';
import type { FileContent } from './handler.ts';

/** What file systems refuse in a name, and characters that are not seen. */
const unfit = /[\\/:*?"<>|]|\p{Cf}/gu;

/** Sends a download under its name. */
export function sendFile(res: Response, kind: FileAnswer, file: FileContent): void {
  res.attachment(file.filename.replace(unfit, '-'));
  res.type(kind.file);
  res.send(typeof file.content === 'string' ? file.content : Buffer.from(file.content));
}
