import { type Express } from 'express';
import { MediaEntity } from '../../db/entities/media';
import { type PersonEntity } from '../../db/entities/person';
import { type Deps } from '../../deps';
import { missing } from '../../http/errors';
import { isModerator, personOf } from '../../http/person';
import { photoForm, photoSizes } from './photo-sizes';

/** Its owner, everybody for what a published plan shows, holders of a bench copy, moderators. */
export async function maySee(
  deps: Deps,
  hash: string,
  person: PersonEntity | null,
): Promise<boolean> {
  if (isModerator(person)) return true;
  const rows: unknown[] = await deps.db.query(
    `SELECT 1 FROM media_uses u JOIN plans p ON p.id = u.plan_id WHERE u.hash = $1
       AND (p.state = 'published' OR p.owner_id = $2 OR EXISTS (SELECT 1 FROM bench_copies b WHERE b.plan_id = p.id AND b.person_id = $2))
     UNION ALL SELECT 1 FROM media_owners WHERE hash = $1 AND person_id = $2 LIMIT 1`,
    [hash, person?.id ?? null],
  );
  return rows.length > 0;
}

/** What answers a name: small and large stand in for each other while the work goes on, photos by what is accepted. */
function formOf(media: MediaEntity, rendition: string, accept: string | undefined) {
  const there = new Set(Object.keys(media.renditions));
  if (media.kind === 'photo' && rendition in photoSizes)
    return media.renditions[photoForm(rendition, accept, there)] ?? media.renditions.large;
  const films = ['720', '360', 'original'];
  const wanted =
    media.kind === 'clip' && films.includes(rendition) ? [rendition, ...films] : [rendition];
  const name = wanted.find((each) => there.has(each));
  return name === undefined ? undefined : media.renditions[name];
}

/**
 * `/media/<hash>/<rendition>`: asks for permission, then leads to a signed address on the media origin.
 * HEAD is answered here with type and length (a signed address is good for GET only), so that a browser
 * can say how much it would keep.
 */
export function registerMediaFiles(app: Express, deps: Deps): void {
  app.get('/media/:hash/:rendition', async (req, res) => {
    const { hash, rendition } = req.params;
    const media = /^[0-9a-f]{64}$/.test(hash)
      ? await deps.db.getRepository(MediaEntity).findOneBy({ hash })
      : null;
    const file = media ? formOf(media, rendition, req.get('accept')) : undefined;
    if (!media || !file || !(await maySee(deps, hash, personOf(req))))
      throw missing('That picture or clip');
    res.set('Cache-Control', 'private, max-age=900').vary('Accept');
    if (req.method === 'HEAD') {
      const bytes = await deps.storage.size(file.key);
      res
        .type(file.type)
        .set({ 'Content-Length': String(bytes), 'Accept-Ranges': 'bytes' })
        .end();
      return;
    }
    res.redirect(302, await deps.storage.signedUrl(file.key, file.type, deps.now()));
  });
}
