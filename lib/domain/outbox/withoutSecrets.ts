// 32 random bytes in base64url, after the pages that take them.
const secret = /(\/(?:confirm|reset-password|invitations)\/)[\w%-]{20,}/g

/** A letter as the office may read it: links that open an account to whoever holds them are blotted out. */
export const withoutSecrets = (text: string): string => text.replace(secret, '$1…')
