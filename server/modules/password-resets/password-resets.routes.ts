import {
  PASSWORD_RESETS_PATH,
  PASSWORD_RESET_REDEMPTIONS_PATH,
  passwordResetRedemptionSchema,
  passwordResetSchema,
} from '../../../shared/contract/session';
import type { Database } from '../../db/client';
import { publicRoute, type RouteDefinition } from '../../http/route-definition';
import type { JobPort } from '../../jobs/job-port';
import { redeemReset } from './redeem-reset';
import { requestReset } from './request-reset';

export function passwordResetRoutes(deps: { db: Database; jobs: JobPort }): RouteDefinition[] {
  return [
    publicRoute({
      method: 'post',
      path: PASSWORD_RESETS_PATH,
      summary: 'Ask for a link by e-mail to choose a new password',
      requestSchema: passwordResetSchema.required(),
      responses: { 202: null },
      handle: ({ body, networkAddress }) => requestReset(deps, { email: body.email, networkAddress }),
    }),
    publicRoute({
      method: 'post',
      path: PASSWORD_RESET_REDEMPTIONS_PATH,
      summary: 'Redeem the link and set the new password',
      requestSchema: passwordResetRedemptionSchema.required(),
      responses: { 204: null },
      handle: ({ body }) => redeemReset(deps, body),
    }),
  ];
}
