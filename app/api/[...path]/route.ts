import { unknownAddress } from '@/lib/api/unknown-address';

// Whatever no other route answers: a device gets JSON here and not a page.
export const GET = unknownAddress;
export const POST = unknownAddress;
export const PUT = unknownAddress;
export const PATCH = unknownAddress;
export const DELETE = unknownAddress;
