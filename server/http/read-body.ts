import express, { type Request, type RequestHandler, type Response } from 'express';
import multer from 'multer';
import type { Endpoint } from '../../shared/api/endpoint';
import { problem } from './problem';

const JSON_LIMIT = '256kb';
const RAW_LIMIT = '1mb';
export const FILE_LIMIT_BYTES = 25 * 1024 * 1024;

const json = express.json({ limit: JSON_LIMIT, strict: true });
const raw = express.raw({ limit: RAW_LIMIT, type: () => true });
const form = multer({ storage: multer.memoryStorage(), limits: { fileSize: FILE_LIMIT_BYTES, files: 1, fields: 5, fieldSize: 1_000, parts: 6, headerPairs: 50 } }).single('photo');

const run = (middleware: RequestHandler, request: Request, response: Response): Promise<void> =>
  new Promise((resolve, reject) => {
    void middleware(request, response, (error?: unknown) => (error === undefined ? resolve() : reject(error as Error)));
  });

/** Reads the body as the endpoint declares it. @throws problem malformed, or the parser's error (see errors.ts) */
export async function readBody(request: Request, response: Response, { bodyType, body }: Pick<Endpoint, 'bodyType' | 'body'>): Promise<unknown> {
  if (bodyType === 'raw') await run(raw, request, response);
  else if (bodyType === 'multipart') {
    if (!request.is('multipart/form-data')) throw problem('malformed', 'Send the picture as multipart/form-data.');
    await run(form, request, response);
  } else if (body !== undefined) {
    if (!request.is('application/json')) throw problem('malformed', 'Send JSON, with Content-Type application/json.');
    await run(json, request, response);
  }
  return request.body as unknown;
}
