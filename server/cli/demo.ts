import { existsSync } from 'node:fs';
import { mkdtemp, copyFile, writeFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import pino from 'pino';
import { v5 } from 'uuid';
import { type Role } from '../../shared/api/accounts';
import { toVtt } from '../../shared/captions';
import { makeDataSource } from '../db/data-source';
import { PersonEntity } from '../db/entities/person';
import { planDocumentSchema } from '../../shared/plan/document';
import { PlanEntity } from '../db/entities/plan';
import { type Deps } from '../deps';
import { builtDemoPlans } from '../demo';
import { trammelTalk } from '../demo/trammel.data';
import { readEnv } from '../env';
import { hashPassword } from '../features/accounts/passwords';
import { beginDraft, keepDraft, publishDraft } from '../features/drafts/drafts.service';
import { keepCaptions, keepClip, keepPhoto } from '../features/media/media.service';
import { post, settle } from '../features/talk/talk.service';
import { demoPeople } from '../local/demo-people';
import { makeStorage } from '../storage/storage';
import { type Command } from './index';

const namespace = '0f4bd1a8-5c3e-4a55-8a0c-3f8f3c4f5b10';
const idOf = (name: string) => v5(name, namespace);
const assets = join(__dirname, '../../assets/demo');

interface Who {
  key: string;
  name: string;
  shop: string | null;
  roles: Role[];
  email: string;
}
const people: Who[] = [
  {
    key: 'odalys',
    name: 'Odalys Adze',
    shop: 'Marrow Lane Workshop',
    roles: ['viewer', 'creator'],
    email: 'odalys@marrow-lane.example',
  },
  {
    key: 'corbin',
    name: 'Corbin Sill',
    shop: 'Quill Street Joinery',
    roles: ['viewer', 'creator'],
    email: 'corbin@quill-street.example',
  },
  {
    key: 'tilda',
    name: 'Tilda Spokeshave',
    shop: 'Plumb Hollow',
    roles: ['viewer'],
    email: 'tilda@plumbhollow.example',
  },
  {
    key: 'bram',
    name: 'Bram Oxenfold',
    shop: null,
    roles: ['viewer'],
    email: 'bram@fallow-yard.example',
  },
  {
    key: 'gus',
    name: 'Gus Tenon',
    shop: null,
    roles: ['viewer', 'moderator'],
    email: 'gus@scantling.example',
  },
  {
    key: 'ada',
    name: 'Ada Wane',
    shop: null,
    roles: ['viewer', 'admin'],
    email: 'ada@scantling.example',
  },
];

type Cast = Record<string, PersonEntity>;

/** A caption as the demo says it. */
interface Spoken {
  start: number;
  end: number;
  text: string;
}

async function makePeople(deps: Deps): Promise<Cast> {
  const repository = deps.db.getRepository(PersonEntity);
  const passwordHash = await hashPassword(demoPeople()[0]?.password ?? 'cut once measure twice');
  const cast: Cast = {};
  for (const { key, name, shop, roles, email } of people) {
    cast[key] = await repository.save(
      repository.create({
        id: idOf(key),
        email,
        emailConfirmedAt: deps.now(),
        displayName: name,
        handle: name.toLowerCase().replace(/ /g, '-'),
        shopName: shop,
        passwordHash,
        roles,
        preferences: { units: key === 'corbin' ? 'mm' : 'in' },
        suspendedUntil: null,
        suspendedFor: null,
      }),
    );
  }
  return cast;
}

/** Copies a file aside: the keepers take files as uploads leave them. */
async function upload<T>(
  name: string,
  content: string | null,
  keep: (file: { path: string; name: string }) => Promise<T>,
): Promise<T> {
  const folder = await mkdtemp(join(tmpdir(), 'scantling-demo-'));
  const path = join(folder, name);
  try {
    if (content === null) await copyFile(join(assets, name), path);
    else await writeFile(path, content);
    return await keep({ path, name });
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}

async function media(deps: Deps, person: PersonEntity, key: string, captions: Spoken[]) {
  const has = (name: string) => existsSync(join(assets, name));
  const clip = has(`${key}.mp4`)
    ? await upload(`${key}.mp4`, null, (f) => keepClip(deps, person, f, true))
    : null;
  const cover = has(`${key}.webp`)
    ? await upload(`${key}.webp`, null, (f) => keepPhoto(deps, person, f))
    : null;
  const vtt = await upload(
    `${key}.vtt`,
    toVtt(captions.map((cue) => ({ ...cue, words: [] }))),
    (f) => keepCaptions(deps, person, f),
  );
  return { clip, cover, vtt };
}

async function publishAll(deps: Deps, cast: Cast): Promise<void> {
  for (const { key, maker, built } of builtDemoPlans()) {
    const person = cast[maker]!;
    const { clip, cover, vtt } = await media(deps, person, key, built.captions);
    const document = {
      ...built.document,
      ...(cover
        ? {
            cover: cover.hash,
            coverAlt: `Line drawing of the ${built.document.title.toLowerCase()}.`,
          }
        : {}),
      ...(clip
        ? {
            clip: {
              source: 'upload' as const,
              media: clip.hash,
              duration: built.duration,
              captions: vtt.hash,
            },
          }
        : {}),
    };
    await beginDraft(deps, person, {
      id: document.id,
      title: document.title,
      units: document.units,
    });
    const { version } = await keepDraft(deps, person, document.id, 1, document);
    await publishDraft(deps, person, document.id, { version, note: '', overrides: [] });
  }
}

/** The trammel is a draft with its clip and captions; the steps are still to be made of them. */
async function beginTrammel(deps: Deps, cast: Cast): Promise<void> {
  let clock = 0;
  const cues = trammelTalk.flatMap(({ seconds, says }) => {
    const words = says.split(' ');
    const each = (seconds - 1) / Math.ceil(words.length / 9);
    const start = clock;
    clock += seconds;
    return Array.from({ length: Math.ceil(words.length / 9) }, (_, i) => ({
      start: start + i * each,
      end: start + (i + 1) * each - 0.1,
      text: words.slice(i * 9, i * 9 + 9).join(' '),
    }));
  });
  const { clip, cover, vtt } = await media(deps, cast.odalys!, 'trammel', cues);
  const id = idOf('trammel');
  const draft = await beginDraft(deps, cast.odalys!, {
    id,
    title: 'Routed-circle trammel',
    units: 'mm',
  });
  const document = {
    scantling: 1 as const,
    id,
    title: draft.draft.title,
    units: 'mm' as const,
    summary: 'An arm that swings a router round a pin.',
    ...(cover ? { cover: cover.hash } : {}),
    ...(clip
      ? {
          clip: {
            source: 'upload' as const,
            media: clip.hash,
            duration: clock,
            captions: vtt.hash,
          },
        }
      : {}),
  };
  await keepDraft(deps, cast.odalys!, id, 1, planDocumentSchema.parse(document));
}

async function talk(deps: Deps, cast: Cast): Promise<void> {
  const plan = await deps.db.getRepository(PlanEntity).findOneByOrFail({ slug: 'shooting-board' });
  const step4 = builtDemoPlans()[0]!.built.document.steps[3]!.id;
  await post(
    deps,
    plan.id,
    {
      id: idOf('c1'),
      kind: 'critique',
      stance: 'change',
      anchor: { on: 'step', elementId: step4 },
      text: 'Say which end to close first. My runway came out 1/32 wide at the near end.',
      why: 'The bed crept toward the clamp I closed first.',
    },
    cast.bram!,
  );
  await post(
    deps,
    plan.id,
    {
      id: idOf('a1'),
      kind: 'answer',
      parentId: idOf('c1'),
      text: 'Right. From the middle out, and look at the spacer after each clamp.',
    },
    cast.odalys!,
  );
  await settle(deps, idOf('c1'), idOf('a1'), cast.odalys!);
  await post(
    deps,
    plan.id,
    {
      id: idOf('q1'),
      kind: 'question',
      anchor: { on: 'step', elementId: step4 },
      text: 'Can I brad the bed down instead of clamping?',
    },
    cast.tilda!,
  );
}

export const command: Command = {
  name: 'demo',
  summary: 'loads the demo data into an empty database',
  async run() {
    const env = readEnv(process.env);
    const db = await makeDataSource(env.DATABASE_URL, 3).initialize();
    try {
      if (await db.getRepository(PersonEntity).existsBy({ id: idOf('odalys') })) {
        console.log('The demo data is there already.');
        return 0;
      }
      const storage = makeStorage(env);
      await storage.ensureBucket();
      // Letters are not sent; work on media is found by the server's sweep when it starts.
      const nothing = () => Promise.resolve();
      const jobs = { mail: nothing, send: nothing, work: nothing, stop: nothing };
      const deps: Deps = {
        env,
        db,
        storage,
        jobs,
        log: pino({ level: 'silent' }),
        now: () => new Date(),
      };
      const cast = await makePeople(deps);
      await publishAll(deps, cast);
      await beginTrammel(deps, cast);
      await talk(deps, cast);
      console.log('Demo data loaded.');
      return 0;
    } finally {
      await db.destroy();
    }
  },
};
export default command;
