import { type Router } from 'express';
import * as api from '../../../shared/api/talk';
import { type Deps } from '../../deps';
import { route, signedIn } from '../../http/route';
import { edit, listThreads, post, settle, takeBack } from './talk.service';

export function registerTalk(router: Router, deps: Deps): void {
  route(router, deps, api.listTalk, ({ params, query, person }) =>
    listThreads(deps, params.planId, query, person),
  );
  route(router, deps, api.postComment, ({ params, body, person }) =>
    post(deps, params.planId, body, signedIn(person)),
  );
  route(router, deps, api.editComment, ({ params, body, person }) =>
    edit(deps, params.commentId, body, signedIn(person)),
  );
  route(router, deps, api.deleteComment, ({ params, person }) =>
    takeBack(deps, params.commentId, signedIn(person)),
  );
  route(router, deps, api.settleComment, ({ params, body, person }) =>
    settle(deps, params.commentId, body.answerId, signedIn(person)),
  );
}
