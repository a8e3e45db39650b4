import multer from 'multer';
import { z } from 'zod';

import { editableTables } from '#shared/contracts/tableColumns';

import type { ApiRouter } from '../../http/ApiRouter.ts';
import { HttpError } from '../../http/HttpError.ts';
import { validate } from '../../http/validate.ts';
import type { Services } from '../../services/Services.ts';
import { isEditableTable } from '../../services/uploads/UploadService.ts';

const fileSize = 8 * 1024 * 1024;

const formSchema = z.object({
  table: z.string(),
  dryRun: z.enum(['true', 'false', '1', '0', '']).default('false'),
  columns: z.string().max(100_000).optional(),
});
const columnsSchema = z.record(z.string(), z.string().nullable());

const invalid = (column: string, message: string): HttpError =>
  new HttpError(422, 'invalid', message, { problems: [{ row: null, column, message }] });

function readColumns(text: string | undefined): Readonly<Record<string, string | null>> {
  if (text === undefined || text === '') return {};
  let json: unknown;
  try {
    json = JSON.parse(text);
  } catch {
    throw invalid('columns', 'columns holds no JSON, expected {"own header": "our column"}');
  }
  const read = columnsSchema.safeParse(json);
  if (!read.success) throw invalid('columns', 'columns reads otherwise, expected {"own header": "our column" or null}');
  return read.data;
}

export function uploadsRoutes(api: ApiRouter, { uploads }: Services): void {
  const form = multer({
    storage: multer.memoryStorage(),
    limits: { fileSize, files: 1, fields: 10, fieldSize: 200_000 },
    defParamCharset: 'utf8',
  }).single('file');
  api.building(
    'POST',
    '/api/buildings/:id/uploads',
    async ({ request, response, signedIn, building }) => {
      const { table, dryRun, columns } = validate(formSchema, request.body);
      if (!isEditableTable(table)) {
        throw invalid('table', `table reads "${table}", expected one of ${editableTables.join(', ')}`);
      }
      if (request.file === undefined) throw invalid('file', 'file is missing, expected one CSV file');
      const answer = await uploads.take(signedIn.caller, building, {
        fileName: request.file.originalname,
        bytes: request.file.buffer,
        table,
        dryRun: dryRun === 'true' || dryRun === '1',
        columns: readColumns(columns),
      });
      response.json(answer);
    },
    [form],
  );
}
