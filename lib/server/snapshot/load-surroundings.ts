import 'server-only';
import { asId } from '@/lib/domain/site/ids';
import type { Site } from '@/lib/domain/site/site';
import { AreaRow } from '@/models/area';
import { ContactRow } from '@/models/contact';
import { CourseRow } from '@/models/course';
import { ReservedAddressRow } from '@/models/reserved-address';
import { SharedPointRow } from '@/models/shared-point';
import type { Within } from './group-rows';

type Surroundings = Pick<Site, 'areas' | 'contacts' | 'courses' | 'sharedPoints'> & Pick<Site['network'], 'reserved'>;

export const loadSurroundings = async (within: Within): Promise<Surroundings> => {
  const [areas, contacts, courses, sharedPoints, reserved] = await Promise.all([
    AreaRow.findAll({ ...within, order: ['position', 'name'] }),
    ContactRow.findAll({ ...within, order: ['position'] }),
    CourseRow.findAll({ ...within, order: ['position', 'name'] }),
    SharedPointRow.findAll({ ...within, order: ['position', 'name'] }),
    ReservedAddressRow.findAll({ ...within, order: ['position', 'address'] }),
  ]);
  return {
    areas: areas.map((row) => ({ id: asId(row.id), name: row.name, version: row.version })),
    contacts: contacts.map((row) => ({ kind: row.kind, name: row.name, phone: row.phone, email: row.email })),
    courses: courses.map((row) => ({ id: asId(row.id), name: row.name })),
    sharedPoints: sharedPoints.map((row) => ({ id: asId(row.id), name: row.name, kind: row.kind })),
    reserved: reserved.map((row) => ({ address: row.address, reason: row.reason })),
  };
};
