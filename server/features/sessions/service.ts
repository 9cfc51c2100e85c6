/** What the client learns about who is signed in. */
import type { DataSource } from 'typeorm';
import type { SessionView } from '../../../shared/api/people';
import { notFound } from '../../http/refused';

interface Row {
  id: string;
  name: string;
  email: string;
  language: 'en' | 'es';
  roles: SessionView['roles'];
}

export class SessionsService {
  constructor(private readonly database: DataSource) {}

  async view(person: string): Promise<SessionView> {
    const rows = await this.database.query<Row[]>(
      `SELECT p.id, p.name, p.email, p.language,
         coalesce(json_agg(json_build_object('site', s.id, 'siteName', s.name, 'role', r.role) ORDER BY s.name, r.role)
           FILTER (WHERE s.id IS NOT NULL), '[]') AS roles
       FROM person p LEFT JOIN person_role r ON r.person = p.id LEFT JOIN site s ON s.id = r.site
       WHERE p.id = $1 GROUP BY p.id`,
      [person],
    );
    const row = rows[0];
    if (!row) throw notFound();
    const { roles, ...rest } = row;
    return { person: rest, roles };
  }
}
