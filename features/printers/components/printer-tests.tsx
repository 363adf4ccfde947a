'use client';

import { useEffect, useRef, useState, useTransition } from 'react';
import { FormPart } from '@/components/form/form-part';
import { sayInstant } from '@/lib/domain/devices/say-instant';
import { ProblemError } from '@/lib/http/client';
import { notePrintedTest } from '../api/printers';
import type { PanelView, TillTest } from '../panel-view';

const standing = (test: TillTest, timeZone: string): string => {
  if (test.testPrintedAt !== null) return `printed ${sayInstant(test.testPrintedAt, timeZone)}`;
  if (!test.installed) return 'not installed there';
  return test.reaches ? 'to do' : 'no reach';
};

type TestsProps = { readonly view: PanelView; readonly printer: string; readonly changed: () => void };

/** Till by till: print the test from the till, look at the paper, then say so here. */
export function PrinterTests({ view, printer, changed }: TestsProps) {
  const [refused, setRefused] = useState('');
  const [busy, startTransition] = useTransition();
  const place = useRef<HTMLDivElement>(null);
  useEffect(() => {
    // The panel around it is shown after its parts are in place.
    const shown = requestAnimationFrame(() => {
      if (window.location.hash === '#tests') place.current?.scrollIntoView();
    });
    return () => cancelAnimationFrame(shown);
  }, []);
  const note = (till: string, printed: boolean): void => startTransition(async () => {
    try {
      await notePrintedTest(view.siteId, printer, { till, printed });
      setRefused('');
      changed();
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      setRefused(error.problem.detail);
    }
  });
  return (
    <div ref={place} className="scroll-mt-16">
      <FormPart title="Tests">
      <p className="text-[13px] text-soft">Print a test page from each till, see it come out, then say so here.</p>
      <ul className="grid gap-px overflow-hidden rounded-md border border-line bg-line">
        {view.tests.map((test) => (
          <li key={test.till} className="flex flex-wrap items-center gap-x-3 bg-raised px-3 py-1.5 text-[13.5px]">
            <b className="min-w-24">{test.name}</b>
            <span className={test.testPrintedAt === null ? 'text-soft' : 'text-calm-text'} title={test.why}>{standing(test, view.timeZone)}</span>
            {view.mayTest && test.installed ? (
              <button
                type="button"
                disabled={busy}
                className="ml-auto min-h-9 font-semibold underline underline-offset-3"
                aria-label={test.testPrintedAt === null ? `A test from ${test.name} printed` : `The test from ${test.name} no longer counts`}
                onClick={() => note(test.till, test.testPrintedAt === null)}
              >
                {test.testPrintedAt === null ? 'It printed' : 'Take back'}
              </button>
            ) : null}
          </li>
        ))}
      </ul>
      <p role="status" className="text-[12.5px] font-semibold text-hot-text empty:hidden">{refused}</p>
    </FormPart>
    </div>
  );
}
