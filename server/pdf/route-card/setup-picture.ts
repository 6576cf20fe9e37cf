import type { Route, SetUp } from '../../../shared/route/route';
import type { CardPicture } from './setup-block';

export function setUpPicture(_route: Route, _setup: SetUp): CardPicture | null {
  return null;
}
