import { type CustomDecorator, SetMetadata } from '@nestjs/common';

export const PUBLIC = 'resistry:public';

/** A route that anybody may call, signed in or not. */
export const Public = (): CustomDecorator => SetMetadata(PUBLIC, true);
