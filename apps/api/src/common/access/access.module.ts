import { Global, Module } from '@nestjs/common';

import { GrantsService } from './grants.service.js';
import { OwnershipService } from './ownership.service.js';

@Global()
@Module({ providers: [GrantsService, OwnershipService], exports: [GrantsService, OwnershipService] })
export class AccessModule {}
