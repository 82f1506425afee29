import { actions } from './actions';
import { actionsOfBeingTold, handlersOfBeingTold, pagesOfBeingTold } from './being-told';
import {
  actionsOfAccounts,
  actionsOfComingIn,
  filesToTakeAway,
  pagesOfComingIn,
} from './coming-in';
import type { Endpoint } from './endpoint';
import { handlers } from './handlers';
import { pages } from './pages';

/**
 * Every page, route handler and server action, with what each person gets from it. An endpoint of the
 * build that is not here fails a test, as does a row without an endpoint.
 */
export const endpoints: readonly Endpoint[] = [
  ...pages,
  ...pagesOfComingIn,
  ...pagesOfBeingTold,
  ...handlers,
  ...filesToTakeAway,
  ...handlersOfBeingTold,
  ...actions,
  ...actionsOfComingIn,
  ...actionsOfAccounts,
  ...actionsOfBeingTold,
];
