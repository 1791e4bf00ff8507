import { Router } from 'express';
import type { Response } from 'express';
import { importSchema } from '@/shared/registerCsv';
import { currentUser, requireRole, requireUser } from '../middleware/requireUser';
import { parse } from '../parse';
import { exportPeople, exportRubberGoods } from '../services/exportRegister';
import { importPeople, importRubberGoods } from '../services/importRegister';

/** The register as a spreadsheet, in and out. For the safety office. */
export const registerImportRouter = Router();

const forSafety = [requireUser, requireRole('safety')];

for (const [subject, importRows] of [
  ['users', importPeople],
  ['rubber-goods', importRubberGoods],
] as const) {
  registerImportRouter.post(`/${subject}/import`, ...forSafety, async (req, res) => {
    const body = parse(importSchema, req.body);
    const answer = await importRows(currentUser(req), body);
    res.status(answer.created > 0 ? 201 : 200).json(answer);
  });
}

function sendCsv(res: Response, name: string, csv: string): void {
  res
    .setHeader('Content-Type', 'text/csv; charset=utf-8')
    .setHeader('Content-Disposition', `attachment; filename="${name}.csv"`)
    .send(csv);
}

registerImportRouter.get('/users/export.csv', ...forSafety, async (_req, res) => {
  sendCsv(res, 'people', await exportPeople());
});

registerImportRouter.get('/rubber-goods/export.csv', ...forSafety, async (_req, res) => {
  sendCsv(res, 'rubber-goods', await exportRubberGoods());
});
