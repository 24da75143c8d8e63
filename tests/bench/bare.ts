import express from 'express';
import { createServer } from 'node:http';
import { Pool } from 'pg';

/**
 * The least a server could do for the plan page: the same rows from the same database, with pg and
 * Express alone; no session, no validation, no presenter. A process of its own, as ours is: prints its
 * address as JSON and ends when its standard input does.
 */
function main(databaseUrl: string): void {
  const pool = new Pool({ connectionString: databaseUrl, max: 10 });
  const app = express().disable('x-powered-by');
  const rows = async (sql: string, values: unknown[]) =>
    (await pool.query<Record<string, unknown>>(sql, values)).rows;
  app.get('/api/plans/:slug', async (request, response) => {
    const [plan] = await rows('SELECT * FROM plans WHERE slug = $1', [request.params.slug]);
    const id = plan?.id;
    const [revision] = await rows('SELECT * FROM revisions WHERE id = $1', [
      plan?.current_revision_id,
    ]);
    const [maker, revisions, talk, copies] = await Promise.all([
      rows('SELECT * FROM people WHERE id = $1', [plan?.owner_id]),
      rows(
        'SELECT id, plan_id, letter, sha256, note, overrides, published_at FROM revisions WHERE plan_id = $1 ORDER BY published_at DESC',
        [id],
      ),
      rows(
        `SELECT kind, anchor_on, anchor_element_id, count(*)::int AS count FROM comments
         WHERE plan_id = $1 AND parent_id IS NULL AND state = 'shown' GROUP BY 1, 2, 3`,
        [id],
      ),
      rows('SELECT count(*)::int AS all FROM bench_copies WHERE plan_id = $1', [id]),
    ]);
    response.json({ revision, maker: maker[0], revisions, talk, copies: copies[0] });
  });
  const server = createServer(app);
  server.listen(0, '127.0.0.1', () => {
    const address = server.address();
    const port = address !== null && typeof address === 'object' ? address.port : 0;
    console.log(JSON.stringify({ address: `http://127.0.0.1:${port}` }));
  });
  process.stdin.resume().once('end', () => process.exit(0));
}

main(process.env.DATABASE_URL ?? '');
