import { ourRule } from '@/lib/our-rules';

/** A coat older than this share of its life has to be stripped before it is renewed; the number is our rule, that it has to be is common practice. */
export const stripAtShare = 1.15;

export const stripSource = ourRule('stripping');
