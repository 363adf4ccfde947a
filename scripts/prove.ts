import { readFileSync } from 'node:fs';
import { parseArgs } from 'node:util';
import { bySeverity, type Finding } from '@/lib/domain/findings/finding';
import { checkSite } from '@/lib/domain/checks/check-site';
import { asOrder, orderSchema } from '@/lib/domain/orders/order-schema';
import { provePlan } from '@/lib/domain/proof/prove';
import { reportDrill, reportOrder, reportProof } from '@/lib/domain/proof/report';
import { readSiteFile } from '@/lib/domain/site-file/read-site-file';
import type { Plan } from '@/lib/domain/site/plan';
import { presentOf } from '@/lib/domain/site/present';
import type { Site } from '@/lib/domain/site/site';

/** Exit codes: 0 nothing to fix, 1 a stop finding or a refused order, 2 the command or a file cannot be read. */
const usage = 'usage: npm run prove -- site.json [--plan NAME] [--order order.json] [--drill]';

const fail = (message: string, more: object = {}): never => {
  process.stdout.write(`${JSON.stringify({ error: message, ...more }, null, 2)}\n`);
  process.exit(2);
};

const read = (path: string): string => {
  try {
    return readFileSync(path, 'utf8');
  } catch {
    return fail(`The file ${path} cannot be read. Check its name and that you may open it.`);
  }
};

const choosePlans = (site: Site, wanted: string | undefined): readonly Plan[] => {
  if (wanted === undefined) return site.plans;
  const plans = site.plans.filter((plan) => plan.name.toLowerCase() === wanted.toLowerCase());
  return plans.length > 0 ? plans : fail(`The site has no plan called ${wanted}. It has: ${site.plans.map((plan) => plan.name).join(', ')}.`);
};

const readOrder = (path: string) => {
  let json: unknown;
  try {
    json = JSON.parse(read(path));
  } catch {
    return fail(`${path} is not JSON.`);
  }
  const parsed = orderSchema.safeParse(json);
  return parsed.success ? asOrder(parsed.data) : fail(`${path} is not an order.`, { faults: parsed.error.issues.map((issue) => ({ path: issue.path.join('.'), message: issue.message })) });
};

const options = (() => {
  try {
    return parseArgs({ allowPositionals: true, options: { plan: { type: 'string' }, order: { type: 'string' }, drill: { type: 'boolean' } } });
  } catch (error) {
    return fail(`${(error as Error).message} ${usage}`);
  }
})();
const [file, ...extra] = options.positionals;
const path = file === undefined || extra.length > 0 ? fail(usage) : file;
const reading = readSiteFile(read(path));
const site = reading.ok ? reading.site : fail('The site file cannot be taken.', { faults: reading.faults });
const order = options.values.order === undefined ? null : readOrder(options.values.order);

const plans = choosePlans(site, options.values.plan).map((plan) => {
  const findings: readonly Finding[] = bySeverity<Finding>([...provePlan(site, plan).findings, ...checkSite(site, plan)]);
  return {
    plan: plan.name,
    version: plan.version,
    proof: { ...reportProof(provePlan(site, plan)), findings },
    ...(options.values.drill === true ? { drill: reportDrill(site, plan) } : {}),
    ...(order === null ? {} : { order: reportOrder(site, plan, presentOf(site), order, { time: '00:00' }) }),
  };
});
process.stdout.write(`${JSON.stringify({ site: site.name, plans }, null, 2)}\n`);
process.exitCode = plans.some(({ proof, order: sent }) => proof.findings.some((finding) => finding.severity === 'stop') || sent?.ok === false) ? 1 : 0;
