import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { clock } from '@/server/clock';
import { Worksheet } from '@/server/models/Worksheet';
import { renderWorksheetPdf, stopPdfWorkers } from '@/server/pdf/renderWorksheetPdf';
import { pdfInput } from '@/server/services/pdfInput';
import { expireWorksheets } from '@/server/services/expireWorksheets';
import { verifyRecord } from '@/server/services/verifyRecord';
import { dateTimeText, windowText } from '@/shared/format';
import type { WorksheetContent } from '@/shared/worksheet';
import { buildCompany, contentFor, create, read, sign, toInForce } from '../../support/record';
import type { Company } from '../../support/record';
import { signIn } from '../../support/server';
import { textOfPdf } from '../../support/pdfText';

/*
 * In Chicago the clocks go from 2:00 to 3:00 on 14 March 2027 (15 U.S.C. 260a:
 * the second Sunday of March), at 08:00 UTC. The tests run in another zone's
 * process time on purpose: nothing may be worked out in the server's own.
 */
const BEFORE = '2027-03-14T02:30:00.000Z';

let company: Company;
beforeAll(async () => {
  company = await buildCompany();
  clock.set(BEFORE);
  // The sessions of the day on which the company was made are over by then.
  for (const person of [company.lead, company.helper, company.supervisor]) {
    person.agent = await signIn(company.app, person.user);
  }
});
beforeEach(() => clock.set(BEFORE));

function nightFrom(startsAt: string, endsAt: string): WorksheetContent {
  const content = contentFor(company);
  const { gloves } = content.protectiveEquipment ?? {};
  return {
    ...content,
    job: { ...content.job, startsAt, endsAt },
    // In test on that day as well.
    protectiveEquipment: {
      ...content.protectiveEquipment,
      gloves: { ...gloves, lastTestedOn: '2027-02-01' },
    },
  };
}

const codesOf = async (content: WorksheetContent) =>
  (await create(company, content)).assessment.findings.map(({ code }) => code);

describe('the change to summer time inside the planned window', () => {
  it('leaves twelve hours twelve hours, though the wall shows thirteen', async () => {
    const twelve = nightFrom('2027-03-13T20:00:00-06:00', '2027-03-14T09:00:00-05:00');
    expect(await codesOf(twelve)).not.toContain('window.too-long');
    const more = nightFrom('2027-03-13T20:00:00-06:00', '2027-03-14T09:01:00-05:00');
    expect(await codesOf(more)).toContain('window.too-long');
  });

  it('expires at the planned instant, to the second', async () => {
    const night = nightFrom('2027-03-13T20:00:00-06:00', '2027-03-14T04:00:00-05:00');
    const [one, other] = [await toInForce(company, night), await toInForce(company, night)];
    // 4:00 in summer time is 09:00 UTC; in winter time it would be 10:00.
    clock.set('2027-03-14T09:00:00.000Z');
    expect((await read(company.lead, one.id)).state).toBe('in-force');
    clock.set('2027-03-14T09:00:01.000Z');
    expect((await read(company.lead, one.id)).state).toBe('expired');
    await expireWorksheets();
    expect((await Worksheet.findByPk(other.id))?.state).toBe('expired');
  });

  it('takes a signature up to that instant and not after it', async () => {
    const night = nightFrom('2027-03-13T20:00:00-06:00', '2027-03-14T04:00:00-05:00');
    const first = await create(company, night);
    const second = await create(company, night);
    clock.set('2027-03-14T08:59:00.000Z');
    expect((await sign(first, 'prepared', company.lead)).state).toBe('briefing');
    clock.set('2027-03-14T09:00:01.000Z');
    await expect(sign(second, 'prepared', company.lead)).rejects.toThrow(/409/);
  });

  it('is written with the abbreviation of either side, on paper and on the screen', async () => {
    const startsAt = '2027-03-13T20:00:00-06:00';
    const endsAt = '2027-03-14T04:00:00-05:00';
    const record = await toInForce(company, nightFrom(startsAt, endsAt));
    const row = await Worksheet.findByPk(record.id, { rejectOnEmpty: true });
    const paper = await textOfPdf(await renderWorksheetPdf(await pdfInput(row, 1), 'en'));
    expect(paper).toContain('13 Mar 2027, 20:00 CST');
    expect(paper).toContain('14 Mar 2027, 04:00 CDT');
    await stopPdfWorkers();
    // The screens write every time through these.
    const { timeZone } = record;
    expect(dateTimeText('en-US', startsAt, timeZone)).toBe('13\u00a0Mar\u00a02027, 20:00\u00a0CST');
    expect(dateTimeText('en-US', endsAt, timeZone)).toBe('14\u00a0Mar\u00a02027, 04:00\u00a0CDT');
    expect(windowText('en-US', startsAt, endsAt, timeZone)).toMatch(/20:00 .*04:00\u00a0CDT$/);
    expect((await verifyRecord()).faults).toEqual([]);
  });
});
