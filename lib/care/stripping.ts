import { type Source } from '@/lib/explain';

/** A coat older than this share of its life has to be stripped before it is renewed; the number is our rule, that it has to be is common practice. */
export const stripAtShare = 1.15;

export const stripSource: Source = { text: 'A coat older than 1.15 times its life is stripped before it is renewed, which costs several times a maintenance coat', ground: 'our rule' };
