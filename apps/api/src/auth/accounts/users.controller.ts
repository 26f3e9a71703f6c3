import { Body, Controller, Get, HttpCode, Param, ParseIntPipe, Patch, Post, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { PageQuery } from '../../common/paging';
import { InvitedUser, PasswordLink, UserView } from '../../users/dto/user.dto';
import { UserPage } from '../../users/dto/user-page.dto';
import { ChangeUser, InviteUser } from '../../users/dto/write-user.dto';
import { UsersService } from '../../users/users.service';
import { CurrentUser, Roles } from '../decorators';
import type { SignedIn } from '../signed-in';
import { InvitationsService } from './invitations.service';

/** The accounts, for the administrator. */
@ApiTags('users')
@Controller('users')
@Roles('administrator')
export class UsersController {
  constructor(
    private readonly users: UsersService,
    private readonly invitations: InvitationsService,
  ) {}

  @Get()
  @ApiOkResponse({ type: UserPage })
  list(@Query() query: PageQuery): Promise<UserPage> {
    return this.users.page(query);
  }

  @Post()
  @ApiCreatedResponse({ type: InvitedUser })
  invite(@Body() wanted: InviteUser, @CurrentUser() by: SignedIn): Promise<InvitedUser> {
    return this.invitations.invite(wanted, by);
  }

  @Patch(':id')
  @ApiOkResponse({ type: UserView })
  change(
    @Param('id', ParseIntPipe) id: number,
    @Body() wanted: ChangeUser,
    @CurrentUser() by: SignedIn,
  ): Promise<UserView> {
    return this.users.change(id, wanted, by);
  }

  @Post(':id/retire')
  @ApiOkResponse({ type: UserView })
  @HttpCode(200)
  retire(@Param('id', ParseIntPipe) id: number, @CurrentUser() by: SignedIn): Promise<UserView> {
    return this.users.retire(id, by);
  }

  @Post(':id/password-link')
  @ApiOkResponse({ type: PasswordLink })
  @HttpCode(200)
  passwordLink(@Param('id', ParseIntPipe) id: number, @CurrentUser() by: SignedIn): Promise<PasswordLink> {
    return this.invitations.passwordLink(id, by);
  }
}
