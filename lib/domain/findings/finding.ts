import type { PortKind } from '../site/till';

/** `stop` may not go live, `check` a person must look, `note` worth knowing. */
export const severities = ['stop', 'check', 'note'] as const;
export type Severity = (typeof severities)[number];

export const severityWords: Readonly<Record<Severity, string>> = {
  stop: 'to fix',
  check: 'to look at',
  note: 'to know',
};

/** The thing a finding is about, and the field of it when there is one. */
export type Subject = {
  readonly kind: 'site' | 'till' | 'printer' | 'station' | 'section' | 'item' | 'option' | 'plan' | 'rule' | 'queue' | 'area';
  readonly id: string;
  /** Name of the form field that holds the mistake. */
  readonly field?: string;
  /** For a queue, the till it is on (the id above is the printer's). */
  readonly till?: string;
};

/**
 * A mend that one press applies; data, so that any screen or script can apply it. `print-test` is the one that
 * needs hands: it leads to where the test is printed and noted.
 */
export type Fix =
  | { readonly kind: 'rename-printer'; readonly printer: string; readonly name: string; readonly label: string }
  | { readonly kind: 'rename-queue'; readonly till: string; readonly printer: string; readonly name: string; readonly label: string }
  | { readonly kind: 'rename-queues'; readonly tills: readonly string[]; readonly printer: string; readonly name: string; readonly label: string }
  | { readonly kind: 'set-queue-port'; readonly till: string; readonly printer: string; readonly portKind: PortKind; readonly portAddress: string; readonly label: string }
  | { readonly kind: 'add-queue'; readonly till: string; readonly printer: string; readonly name: string; readonly portKind: PortKind; readonly portAddress: string; readonly label: string }
  | { readonly kind: 'set-printer-address'; readonly printer: string; readonly address: string; readonly label: string }
  | { readonly kind: 'set-printer-mask'; readonly printer: string; readonly mask: string; readonly label: string }
  | { readonly kind: 'set-printer-gateway'; readonly printer: string; readonly gateway: string; readonly label: string }
  | { readonly kind: 'set-printer-port'; readonly printer: string; readonly port: number; readonly label: string }
  | { readonly kind: 'set-printer-mac'; readonly printer: string; readonly mac: string; readonly label: string }
  | { readonly kind: 'reserve-address'; readonly address: string; readonly reason: string; readonly label: string }
  | { readonly kind: 'set-till-address'; readonly till: string; readonly address: string; readonly label: string }
  | { readonly kind: 'set-till-mask'; readonly till: string; readonly mask: string; readonly label: string }
  | { readonly kind: 'clear-prints-through'; readonly till: string; readonly label: string }
  | { readonly kind: 'clear-default-printer'; readonly till: string; readonly label: string }
  | { readonly kind: 'set-backup'; readonly printer: string; readonly backup: string; readonly label: string }
  | { readonly kind: 'set-stand-in'; readonly station: string; readonly standIn: string; readonly label: string }
  | { readonly kind: 'set-network'; readonly change: Partial<Record<'subnet' | 'gateway' | 'poolFrom' | 'poolTo', string>>; readonly label: string }
  | { readonly kind: 'set-link-address'; readonly address: string; readonly mask: string; readonly label: string }
  | { readonly kind: 'print-test'; readonly printer: string; readonly label: string }
  | { readonly kind: 'send-sections'; readonly plan: string; readonly sections: readonly string[]; readonly stations: readonly string[]; readonly label: string }
  | { readonly kind: 'remove-rule'; readonly plan: string; readonly rule: string; readonly label: string };

/** What a check has to say; `code` is stable, `message` is one or two plain sentences. */
export type Finding = {
  readonly code: string;
  readonly severity: Severity;
  readonly subject: Subject;
  /** The sentence in large type: what is wrong. */
  readonly title: string;
  /** What it means for service and why. */
  readonly message: string;
  readonly fixes: readonly Fix[];
};

const rank: Readonly<Record<Severity, number>> = { stop: 0, check: 1, note: 2 };

/** Worst first; within a severity the order they were found in. */
export const bySeverity = <Found extends Finding>(findings: readonly Found[]): readonly Found[] =>
  findings.toSorted((left, right) => rank[left.severity] - rank[right.severity]);

export const countBySeverity = (findings: readonly Finding[]): Readonly<Record<Severity, number>> => ({
  stop: findings.filter((finding) => finding.severity === 'stop').length,
  check: findings.filter((finding) => finding.severity === 'check').length,
  note: findings.filter((finding) => finding.severity === 'note').length,
});
