import { QueryTypes } from 'sequelize';
import type { Transaction } from 'sequelize';
import type { FieldError } from '@/shared/problem';
import type { WorksheetContent } from '@/shared/worksheet';
import { sequelize } from '../db';

type Crew = NonNullable<WorksheetContent['crew']>;
type CrewMember = Crew[number];

interface Person {
  id: string;
  name: string;
  qualifiedThrough: string | null;
}
interface Gloves {
  id: string;
  kind: string;
  gloveClass: '00' | '0' | '1' | '2' | '3' | '4';
  issuedOn: string | null;
  lastTestedOn: string | null;
  lastTestPassed: boolean | null;
}

export interface RegisterAnswer {
  /** The content with what the register says put in. */
  content: WorksheetContent;
  /** Ids that the register does not hold, or not for this lead. */
  errors: FieldError[];
  siteName: string | null;
}

/** Active people who share an active site with the lead; the lead is always one of them. */
async function peopleOf(leadId: string, ids: string[], transaction?: Transaction) {
  if (ids.length === 0) return [];
  return sequelize.query<Person>(
    `SELECT u.id, u.name, u.qualified_through AS "qualifiedThrough"
       FROM users u
      WHERE u.id = ANY($ids::uuid[]) AND u.retired_at IS NULL
        AND (u.id = $leadId OR EXISTS (
          SELECT 1 FROM site_members theirs
            JOIN site_members ours ON ours.site_id = theirs.site_id AND ours.user_id = $leadId
            JOIN sites s ON s.id = theirs.site_id AND s.retired_at IS NULL
           WHERE theirs.user_id = u.id))`,
    { bind: { ids, leadId }, type: QueryTypes.SELECT, transaction },
  );
}

async function siteOf(leadId: string, siteId: string | undefined, transaction?: Transaction) {
  if (siteId === undefined) return null;
  const [site] = await sequelize.query<{ name: string }>(
    `SELECT s.name FROM sites s JOIN site_members m ON m.site_id = s.id AND m.user_id = $leadId
      WHERE s.id = $siteId AND s.retired_at IS NULL`,
    { bind: { leadId, siteId }, type: QueryTypes.SELECT, transaction },
  );
  return site ?? null;
}

async function glovesOf(leadId: string, id: string | undefined, transaction?: Transaction) {
  if (id === undefined) return null;
  const [gloves] = await sequelize.query<Gloves>(
    `SELECT g.id, g.kind, g.glove_class AS "gloveClass", g.issued_on AS "issuedOn",
            passed.tested_on AS "lastTestedOn", latest.passed AS "lastTestPassed"
       FROM rubber_goods g
       JOIN sites s ON s.id = g.site_id AND s.retired_at IS NULL
       JOIN site_members m ON m.site_id = g.site_id AND m.user_id = $leadId
       LEFT JOIN LATERAL (SELECT t.tested_on FROM rubber_goods_tests t
                           WHERE t.rubber_goods_id = g.id AND t.passed
                           ORDER BY t.tested_on DESC, t.position DESC LIMIT 1) passed ON true
       LEFT JOIN LATERAL (SELECT t.passed FROM rubber_goods_tests t
                           WHERE t.rubber_goods_id = g.id
                           ORDER BY t.tested_on DESC, t.position DESC LIMIT 1) latest ON true
      WHERE g.id = $id AND g.retired_at IS NULL`,
    { bind: { id, leadId }, type: QueryTypes.SELECT, transaction },
  );
  // A pair that failed its latest test is not in use, whoever forgot to retire it.
  return gloves?.kind === 'gloves' && gloves.lastTestPassed === true ? gloves : null;
}

/** The member with the register's name and qualification; nobody without an account is qualified. */
function memberFromRegister(member: CrewMember, person: Person | undefined): CrewMember {
  const { qualifiedThrough: _, ...rest } = member;
  if (person === undefined) {
    return rest.qualified === undefined && _ === undefined ? rest : { ...rest, qualified: false };
  }
  const named = { ...rest, name: person.name };
  return person.qualifiedThrough === null
    ? { ...named, qualified: false }
    : { ...named, qualified: true, qualifiedThrough: person.qualifiedThrough };
}

function notOfTheLead(pointer: string, message: string): FieldError {
  return { pointer, code: 'not-in-register', message };
}

function crewErrors(crew: Crew, people: ReadonlyMap<string, Person>): FieldError[] {
  const seen = new Set<string>();
  return crew.flatMap(({ userId }, index) => {
    if (userId === undefined) return [];
    const pointer = `#/content/crew/${index}/userId`;
    if (seen.has(userId)) {
      return [{ pointer, code: 'twice', message: 'This person is on the crew twice.' }];
    }
    seen.add(userId);
    if (people.has(userId)) return [];
    return [notOfTheLead(pointer, 'This person is not active at a site of the lead.')];
  });
}

function withGloves(content: WorksheetContent, gloves: Gloves | null): WorksheetContent {
  if (gloves === null || gloves.lastTestedOn === null) return content;
  const { issuedOn: _, ...typed } = content.protectiveEquipment?.gloves ?? {};
  return {
    ...content,
    protectiveEquipment: {
      ...content.protectiveEquipment,
      gloves: {
        ...typed,
        gloveClass: gloves.gloveClass,
        lastTestedOn: gloves.lastTestedOn,
        ...(gloves.issuedOn === null ? {} : { issuedOn: gloves.issuedOn }),
      },
    },
  };
}

/**
 * The register wins over the client: name, qualification and its end for a
 * crew member with an account, class and dates for gloves of the register.
 * Called on every save and at every signature; "identical" is judged after it.
 */
export async function applyRegister(
  { content, leadId }: { content: WorksheetContent; leadId: string },
  transaction?: Transaction,
): Promise<RegisterAnswer> {
  const { job, crew, protectiveEquipment } = content;
  const userIds = (crew ?? []).flatMap(({ userId }) => userId ?? []);
  const [found, site, gloves] = [
    await peopleOf(leadId, userIds, transaction),
    await siteOf(leadId, job?.siteId, transaction),
    await glovesOf(leadId, protectiveEquipment?.rubberGoodsId, transaction),
  ];
  const people = new Map(found.map((person) => [person.id, person]));
  const errors = crewErrors(crew ?? [], people);
  if (job?.siteId !== undefined && site === null) {
    errors.push(notOfTheLead('#/content/job/siteId', 'This is no active site of the lead.'));
  }
  if (protectiveEquipment?.rubberGoodsId !== undefined && gloves === null) {
    errors.push(
      notOfTheLead(
        '#/content/protectiveEquipment/rubberGoodsId',
        'These are no gloves in use at a site of the lead.',
      ),
    );
  }
  const filled =
    crew === undefined
      ? content
      : {
          ...content,
          crew: crew.map((member) => memberFromRegister(member, people.get(member.userId ?? ''))),
        };
  return { content: withGloves(filled, gloves), errors, siteName: site?.name ?? null };
}
