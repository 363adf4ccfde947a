'use client';

import { useState } from 'react';
import { Button } from '@/components/button';
import { quantityLeft, type Tab } from '@/lib/domain/orders/tab';
import { asId, type CourseId, type TillId } from '@/lib/domain/site/ids';
import type { Site } from '@/lib/domain/site/site';
import { lineName } from '../event-words';
import type { Played } from '../play-events';
import styles from './try-order.module.css';

type EventButtonsProps = { readonly site: Site; readonly tab: Tab; readonly till: TillId; readonly play: (event: Played['event']) => void };

const heldCourses = (site: Site, tab: Tab): readonly (CourseId | null)[] =>
  [...new Set(tab.lines.filter((line) => line.held && quantityLeft(line) > 0).map(({ line }) => line.course ?? site.menu.items.find((item) => item.id === line.item)?.course ?? null))];

/** Everything that can be done with an order that was sent, each one press. */
export function EventButtons({ site, tab, till, play }: EventButtonsProps) {
  const [line, setLine] = useState(0);
  const [words, setWords] = useState('');
  const [station, setStation] = useState(site.stations[0]?.id ?? asId<never>(''));
  const chosen = tab.lines[line];
  const courses = heldCourses(site, tab);
  const said = words.trim();
  return (
    <div className={styles['events']}>
      <div className={styles['eventRow']}>
        {courses.map((course) => <Button key={course ?? 'none'} kind="primary" onClick={() => play({ kind: 'fire', till, course })}>{`${site.courses.find((one) => one.id === course)?.name ?? 'Held lines'} away`}</Button>)}
        <Button onClick={() => play({ kind: 'rush', till, course: null })}>Rush</Button>
        <Button onClick={() => play({ kind: 'reprint', till, sending: 1 })}>Print again</Button>
      </div>
      <div className={styles['eventRow']}>
        <label className={styles['field']}><span>Line</span>
          <select value={line} onChange={(event) => setLine(Number(event.target.value))}>
            {tab.lines.map((one, index) => <option key={index} value={index}>{quantityLeft(one)} {lineName(site, tab, index)}</option>)}
          </select>
        </label>
        <Button disabled={chosen === undefined || quantityLeft(chosen) < 1} onClick={() => play({ kind: 'void', till, line, quantity: 1 })}>Take one off</Button>
        <Button disabled={chosen === undefined} onClick={() => play({ kind: 'remake', till, line, quantity: 1 })}>Make one again</Button>
      </div>
      <div className={styles['eventRow']}>
        <label className={styles['field']}><span>Words</span><input value={words} maxLength={80} onChange={(event) => setWords(event.target.value)} placeholder="Milk, table 20, no more mint" /></label>
        <Button disabled={said === '' || chosen === undefined} onClick={() => play({ kind: 'amend', till, line, allergies: [...(chosen?.line.allergies ?? []), said.toUpperCase()] })}>Late allergy on the line</Button>
        <Button disabled={said === ''} onClick={() => play({ kind: 'move', till, table: said.replace(/^table\s+/i, '') })}>Move to this table</Button>
        <label className={styles['field']}><span>Station</span>
          <select value={station} onChange={(event) => setStation(asId(event.target.value))}>{site.stations.map(({ id, name }) => <option key={id} value={id}>{name}</option>)}</select>
        </label>
        <Button disabled={said === ''} onClick={() => play({ kind: 'message', till, station, words: said })}>Send as a message</Button>
      </div>
    </div>
  );
}
