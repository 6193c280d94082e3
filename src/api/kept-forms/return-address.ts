import type { Collection } from '../../../shared/contract/kept-things';

/**
 * Where to go once something was made: back to the form that asked for it, told what came of it by
 * `created=<collection>:<id>`, or to the thing itself. Addresses outside the account are not followed.
 */
export function addressAfterCreating(
  created: { collection: Collection; id: string },
  options: { returnTo: string | undefined; basePath: string; otherwise: string },
): string {
  const { returnTo, basePath, otherwise } = options;
  if (!isReturnAddress(returnTo, basePath)) return otherwise;
  const [path = '', query = ''] = returnTo.split('?');
  const parameters = new URLSearchParams(query);
  parameters.append('created', `${created.collection}:${created.id}`);
  return `${path}?${parameters.toString()}`;
}

function isReturnAddress(returnTo: string | undefined, basePath: string): returnTo is string {
  return returnTo !== undefined && returnTo.startsWith(`${basePath}/`) && !returnTo.includes('//');
}
