import type { WorkId, WorkshopList, WorkshopPage, WorkshopRow } from '@linkfell/contracts';
import { tellWork } from '@linkfell/fit-engine';
import { Injectable } from '@nestjs/common';
import { DataSource } from 'typeorm';

import { Clock } from '../common/clock.js';
import { CommonException } from '../common/problems/problem.exception.js';
import { Town } from '../organisations/town.entity.js';
import { greatCircleKm, type Place } from './great-circle.js';

interface Row extends Place {
  id: string;
  name: string;
  town: string;
  about: string;
  street: string;
  postcode: string;
  phone: string;
  email: string;
  vat_number: string;
  time_zone: string;
  stands: number;
  hours: { weekday: number; opens: string; closes: string }[];
  closures: { firstDay: string; lastDay: string; reason: string }[];
  services: { workId: WorkId; minutes: number; priceMinor: number }[];
}

const sql = `
  SELECT o.id, o.name, t.name AS town, o.about, o.street, o.postcode, o.phone, o.email, o.vat_number,
         o.latitude, o.longitude, o.time_zone,
         (SELECT count(*)::int FROM stands s WHERE s.organisation_id = o.id) AS stands,
         (SELECT coalesce(json_agg(json_build_object('weekday', weekday, 'opens', to_char(opens, 'HH24:MI'),
                   'closes', to_char(closes, 'HH24:MI')) ORDER BY weekday, opens), '[]')
            FROM workshop_hours h WHERE h.organisation_id = o.id) AS hours,
         (SELECT coalesce(json_agg(json_build_object('firstDay', first_day, 'lastDay', last_day, 'reason', reason)
                   ORDER BY first_day), '[]')
            FROM workshop_closures c
           WHERE c.organisation_id = o.id AND c.last_day >= ($1::timestamptz AT TIME ZONE o.time_zone)::date) AS closures,
         (SELECT coalesce(json_agg(json_build_object('workId', work_id, 'minutes', minutes, 'priceMinor', price_minor)
                   ORDER BY work_id <> 'fit-shock', price_minor DESC, work_id), '[]')
            FROM workshop_services v WHERE v.organisation_id = o.id) AS services
    FROM organisations o JOIN towns t ON t.id = o.town_id
   WHERE o.is_workshop AND ($2::text IS NULL OR o.id = $2)
   ORDER BY o.name`;

/** Workshops for people who look for one: what they do, when, where and for how much. */
@Injectable()
export class WorkshopDirectoryService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  /** @throws CommonException "not-found" when `from` is no town of ours */
  async list(from?: string): Promise<WorkshopList> {
    const [rows, towns] = await Promise.all([
      this.read(null),
      this.dataSource.manager.find(Town, { order: { name: 'ASC' } }),
    ]);
    const start = from === undefined ? null : towns.find(({ id }) => id === from);
    if (start === undefined) throw new CommonException('not-found');
    const workshops = rows.map((row) => ({
      ...summary(row),
      distanceKm: start && greatCircleKm(start, row),
      closure: row.closures[0] ?? null,
    }));
    if (start) workshops.sort((a, b) => (a.distanceKm ?? 0) - (b.distanceKm ?? 0));
    return { workshops, towns };
  }

  /** @throws CommonException "not-found" when no workshop has this id */
  async page(workshopId: string): Promise<WorkshopPage> {
    const [row] = await this.read(workshopId);
    if (!row) throw new CommonException('not-found');
    const { street, postcode, phone, email, stands, hours, closures } = row;
    return {
      ...summary(row),
      ...{ street, postcode, phone, email, stands, hours, closures },
      vatNumber: row.vat_number,
      timeZone: row.time_zone,
      services: row.services.map((service) => ({
        ...service,
        say: tellWork({ id: service.workId, end: null }).replace(/\.$/, ''),
      })),
    };
  }

  private read(only: string | null): Promise<Row[]> {
    return this.dataSource.query(sql, [this.clock.now(), only]);
  }
}

function summary(row: Row): Omit<WorkshopRow, 'distanceKm' | 'closure'> {
  const fit = row.services.find(({ workId }) => workId === 'fit-shock');
  return {
    id: row.id,
    name: row.name,
    town: row.town,
    about: row.about,
    latitude: row.latitude,
    longitude: row.longitude,
    fitMinor: fit?.priceMinor ?? null,
    fitMinutes: fit?.minutes ?? null,
    works: row.services.map(({ workId }) => workId),
    openWeekdays: [...new Set(row.hours.map(({ weekday }) => weekday))],
  };
}
