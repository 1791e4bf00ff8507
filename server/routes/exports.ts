import { Router } from 'express';
import type { Request } from 'express';
import { z } from 'zod';
import { currentUser } from '../currentUser';
import { requireRole, requireUser } from '../middleware/requireUser';
import { parse } from '../parse';
import { withExportLock } from '../services/exportLock';
import { exportCsv, exportZip, worksheetsToPrint } from '../services/exportWorksheets';
import { worksheetFiltersSchema } from '../services/listWorksheets';

/** Mounted before `/worksheets/:worksheetId`, whose path these two would fit as well. */
export const exportsRouter = Router();

const querySchema = worksheetFiltersSchema.extend({
  language: z.enum(['en', 'es']).default('en'),
});

function filtersOf(req: Request) {
  const { language, ...filters } = parse(querySchema, req.query);
  return { language, filters };
}

exportsRouter.get('/export.csv', requireUser, requireRole('safety'), async (req, res) => {
  const actor = currentUser(req);
  const { filters } = filtersOf(req);
  await withExportLock(actor.id, async () => {
    res
      .setHeader('Content-Type', 'text/csv; charset=utf-8')
      .setHeader('Content-Disposition', 'attachment; filename="worksheets.csv"');
    await exportCsv(actor, filters, res);
  });
});

exportsRouter.get('/export.zip', requireUser, requireRole('safety'), async (req, res) => {
  const actor = currentUser(req);
  const { filters, language } = filtersOf(req);
  await withExportLock(actor.id, async () => {
    const worksheets = await worksheetsToPrint(actor, filters);
    res
      .setHeader('Content-Type', 'application/zip')
      .setHeader('Content-Disposition', 'attachment; filename="worksheets.zip"');
    await exportZip(worksheets, language, res);
  });
});
