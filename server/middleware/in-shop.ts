import type { Request, RequestHandler, Response } from 'express';
import type { Services } from '../services/services';
import type { ShopWork } from '../services/shop-work';
import { workInShop } from '../services/shop-work';
import { signedInOf } from './signed-in';

/** A route of one shop: its whole work is one transaction that sees this shop alone; `answer` writes after it is kept. */
export function inShop<T>(
  services: Services,
  act: (work: ShopWork, request: Request) => Promise<T>,
  answer: (response: Response, result: T) => void = (response, result) => void response.json(result),
): RequestHandler {
  return async (request, response) => {
    const asks = {
      slug: parameter(request, 'shop'),
      personId: signedInOf(response).personId,
      requestId: typeof request.id === 'string' ? request.id : null,
    };
    answer(response, await workInShop(services, asks, (work) => act(work, request)));
  };
}

/** A named piece of the address; empty when it is none. */
export function parameter(request: Request, name: string): string {
  const value = request.params[name];
  return typeof value === 'string' ? value : '';
}
