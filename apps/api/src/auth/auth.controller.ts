import { Body, Controller, Get, HttpCode, Param, Post, Req, Res } from '@nestjs/common';
import { ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import type { Request, Response } from 'express';
import { LinksService } from './accounts/links.service';
import { AuthService } from './auth.service';
import { CurrentUser, Public, Roles } from './decorators';
import { LinkView, Me } from './dto/me.dto';
import { AcceptInvitation, FirstAdministrator, SignIn } from './dto/sign-in.dto';
import type { SignedIn } from './signed-in';

/** Signing in and out, and the links that begin an account. */
@ApiTags('signing in')
@Controller('auth')
export class AuthController {
  constructor(
    private readonly auth: AuthService,
    private readonly links: LinksService,
  ) {}

  @Post('sign-in')
  @ApiOkResponse({ type: Me })
  @Public()
  @HttpCode(200)
  signIn(
    @Body() _: SignIn,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ): Promise<Me> {
    return this.auth.signIn(request, response);
  }

  @Post('sign-out')
  @ApiNoContentResponse()
  @Roles('administrator', 'analyst', 'officer')
  @HttpCode(204)
  signOut(
    @CurrentUser() user: SignedIn,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ): Promise<void> {
    return this.auth.signOut(request, response, user);
  }

  @Get('me')
  @ApiOkResponse({ type: Me })
  @Roles('administrator', 'analyst', 'officer')
  me(@CurrentUser() user: SignedIn): Promise<Me> {
    return this.auth.me(user);
  }

  @Get('link/:token')
  @ApiOkResponse({ type: LinkView })
  @Public()
  link(@Param('token') token: string): Promise<LinkView> {
    return this.links.look(token);
  }

  @Post('first-administrator')
  @ApiOkResponse({ type: Me })
  @Public()
  @HttpCode(200)
  firstAdministrator(@Body() wanted: FirstAdministrator, @Req() request: Request): Promise<Me> {
    return this.links.makeFirstAdministrator(wanted, request);
  }

  @Post('invitations/accept')
  @ApiOkResponse({ type: Me })
  @Public()
  @HttpCode(200)
  accept(@Body() wanted: AcceptInvitation, @Req() request: Request): Promise<Me> {
    return this.links.accept(wanted, request);
  }
}
