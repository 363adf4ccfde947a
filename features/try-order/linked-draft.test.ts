import { describe, expect, it } from 'vitest';
import { anItem, aPlan, aSection, aSite, aTill } from '@/tests/fixtures/build-site';
import { linkedDraft } from './linked-draft';
import { planChoices } from './plan-choices';

const dinner = aPlan([]);
const site = aSite({
  tills: [aTill('till1', 'room', '10.20.30.61'), aTill('till2', 'room', '10.20.30.62')], plans: [dinner],
  menu: { sections: [aSection('late')], items: [anItem('toastie', 'late')] },
});
const choices = planChoices(site, null);
const open = (query: string) => linkedDraft(site, choices, null, new URLSearchParams(query));

describe('a link into try an order', () => {
  it('writes the order that a finding gives as its example', () => {
    expect(open('plan=plan&till=till2&type=take-away&item=toastie')).toMatchObject({
      plan: 'plan', order: { till: 'till2', orderType: 'take-away', lines: [{ item: 'toastie', quantity: 1 }] },
    });
  });

  it('asks for nothing when it names nothing that is there', () => {
    expect(open('')).toBeNull();
    expect(open('plan=breakfast&item=porridge')).toBeNull();
  });

  it('leaves out options that the menu does not have', () => {
    expect(open('item=toastie&option=gone')?.order.lines[0]?.options).toEqual([]);
  });
});
