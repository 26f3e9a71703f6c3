import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { User } from './models/user.model';
import { UserDistricts } from './user-districts';
import { UsersService } from './users.service';

/** The people who sign in. Their routes are in `auth`, which makes the links. */
@Module({
  imports: [SequelizeModule.forFeature([User])],
  providers: [UserDistricts, UsersService],
  exports: [UserDistricts, UsersService],
})
export class UsersModule {}
