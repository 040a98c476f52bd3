/** The account types that the auth adapter writes. */
export type AdapterAccountType = 'oauth' | 'oidc' | 'email' | 'webauthn';
