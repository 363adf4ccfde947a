import 'server-only';
import type { Transaction } from 'sequelize';
import { refuseBroken } from '@/lib/server/devices-of-site';
import { SectionRow } from '@/models/section';

/** Refuses a heading that the menu has already, in words. */
export const mustBeFreeHeading = async (transaction: Transaction, siteId: string, id: string | null, name: string): Promise<void> => {
  const taken = await SectionRow.findOne({ where: { siteId, name }, transaction });
  refuseBroken([{ field: 'name', broken: taken !== null && taken.id !== id, reason: `The menu has a section called “${taken?.name ?? name}” already.` }]);
};
