import * as yup from 'yup';
import { closedObject, idField } from './fields';

/** GET: who is signed in · POST: sign in · DELETE: sign out. */
export const SESSION_PATH = '/api/session';
/** PATCH: what the person prefers. */
export const PREFERENCES_PATH = '/api/session/preferences';
/** POST: ask for a link by e-mail; always 202. */
export const PASSWORD_RESETS_PATH = '/api/password-resets';
/** POST: redeem the link's token. */
export const PASSWORD_RESET_REDEMPTIONS_PATH = '/api/password-resets/redemptions';
/** GET, demo mode only: the demo people. */
export const DEMO_PATH = '/api/demo';
/** GET, demo mode only: what was sent by e-mail, newest first. */
export const DEMO_MAILBOX_PATH = '/api/demo/mailbox';

export const ROLES = ['engineer', 'admin', 'supplier', 'client'] as const;
export type Role = (typeof ROLES)[number];

const UNIT_SYSTEMS = ['metric', 'us_customary'] as const;
export type UnitSystem = (typeof UNIT_SYSTEMS)[number];

const LONGEST_EMAIL = 254;
/** Linear in its input: no two neighbouring parts can match the same character. */
const EMAIL = /^[^\s@]+@[^\s@.]+(?:\.[^\s@.]+)+$/;

const emailField = yup
  .string()
  .strict()
  .required('E-mail: enter your address.')
  .max(LONGEST_EMAIL, `E-mail: at most ${LONGEST_EMAIL} characters.`)
  .test(
    'address',
    'E-mail: enter an address like name@company.example.',
    (text) => text === undefined || text.length > LONGEST_EMAIL || EMAIL.test(text),
  );

export const signInSchema = closedObject({
  email: emailField,
  password: yup
    .string()
    .strict()
    .required('Password: enter it.')
    .max(200, 'Password: at most 200 characters.'),
});

export const preferencesSchema = closedObject({
  unit_system: yup.string().strict().oneOf(UNIT_SYSTEMS, 'Units: use metric or us_customary.').required(),
});

export const passwordResetSchema = closedObject({ email: emailField });

export const passwordResetRedemptionSchema = closedObject({
  token: yup.string().strict().required('Link: open it from the e-mail again.').max(200),
  password: yup
    .string()
    .strict()
    .required('New password: enter one.')
    .min(12, 'New password: at least 12 characters.')
    .max(200, 'New password: at most 200 characters.'),
});

export const sessionResponseSchema = closedObject({
  user: closedObject({
    id: idField('User'),
    name: yup.string().strict().required(),
    email: yup.string().strict().required(),
    unit_system: yup.string().strict().oneOf(UNIT_SYSTEMS).required(),
  }).required(),
  memberships: yup
    .array(
      closedObject({
        account: closedObject({
          id: idField('Account'),
          slug: yup.string().strict().required(),
          name: yup.string().strict().required(),
          currency: yup.string().strict().length(3).required(),
        }).required(),
        roles: yup.array(yup.string().strict().oneOf(ROLES).required()).strict().required(),
        company: closedObject({
          id: idField('Company'),
          name: yup.string().strict().required(),
        })
          .nullable()
          .defined(),
      }),
    )
    .strict()
    .required(),
});

export type SessionResponse = yup.InferType<typeof sessionResponseSchema>;
export type Membership = SessionResponse['memberships'][number];

export const demoResponseSchema = closedObject({
  people: yup
    .array(
      closedObject({
        role: yup.string().strict().required(),
        name: yup.string().strict().required(),
        email: yup.string().strict().required(),
        password: yup.string().strict().required(),
      }),
    )
    .strict()
    .required(),
});

export const demoMailboxResponseSchema = closedObject({
  items: yup
    .array(
      closedObject({
        id: idField('Message'),
        received_at: yup.string().strict().required(),
        to: yup.string().strict().required(),
        subject: yup.string().strict().defined(),
        text: yup.string().strict().defined(),
      }),
    )
    .strict()
    .required(),
});
