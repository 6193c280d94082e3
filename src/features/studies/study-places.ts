import type { Account } from '../../session';

/** Addresses inside the account that the study screens lead to. */
export function studyPlaces(account: Pick<Account, 'basePath'>) {
  const at = (place: string) => `${account.basePath}/${place}`;
  return {
    list: at('studies'),
    create: at('studies/new'),
    study: (id: string) => at(`studies/${id}`),
    edit: (id: string) => at(`studies/${id}/edit`),
    thing: (collection: 'foods' | 'packs' | 'routes' | 'walls', id: string) => at(`${collection}/${id}`),
    createThing: (collection: 'foods' | 'packs' | 'routes' | 'walls', returnTo: string) =>
      `${at(collection)}/new?return=${encodeURIComponent(returnTo)}`,
  };
}
