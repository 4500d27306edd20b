import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { MembershipsModule } from '../memberships/memberships.module.js';
import { Letter } from './entities/letter.entity.js';
import { NotificationsService } from './notifications.service.js';
import { PageLinks } from './page-links.js';

@Module({
  imports: [TypeOrmModule.forFeature([Letter]), MembershipsModule],
  providers: [NotificationsService, PageLinks],
  exports: [NotificationsService, PageLinks],
})
export class NotificationsModule {}
