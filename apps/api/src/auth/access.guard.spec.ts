import { Controller, Get } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { Test } from '@nestjs/testing';
import { roles } from '@lidwatch/contracts';
import type { NextFunction, Request, Response } from 'express';
import type { Server } from 'node:http';
import request from 'supertest';
import { ProblemFilter } from '../common/problem.filter';
import { AccessGuard } from './access.guard';
import { Public, Roles } from './decorators';

@Controller('probe')
class Probe {
  @Get('forgotten')
  forgotten(): string {
    return 'should never be seen';
  }

  @Get('public')
  @Public()
  open(): string {
    return 'seen';
  }

  @Get('officers')
  @Roles('officer')
  officers(): string {
    return 'seen';
  }
}

describe('the access guard', () => {
  let app: NestExpressApplication;
  beforeAll(async () => {
    const providers = [{ provide: APP_GUARD, useClass: AccessGuard }];
    const module = await Test.createTestingModule({ controllers: [Probe], providers }).compile();
    app = module.createNestApplication<NestExpressApplication>({ logger: false });
    app.use((incoming: Request, _: Response, next: NextFunction) => {
      const role = roles.find((each) => each === incoming.get('x-role'));
      if (role)
        incoming.user = { id: 1, name: 'Somebody', email: 'somebody@example.org', role, districtIds: [] };
      next();
    });
    app.useGlobalFilters(new ProblemFilter());
    await app.init();
  });
  afterAll(() => app.close());

  it.each([
    ['forgotten', 'nobody', 401],
    ['forgotten', 'administrator', 403],
    ['forgotten', 'officer', 403],
    ['public', 'nobody', 200],
    ['public', 'analyst', 200],
    ['officers', 'nobody', 401],
    ['officers', 'analyst', 403],
    ['officers', 'officer', 200],
  ])('answers %s to %s with %d', async (route, role, status) => {
    await request(app.getHttpServer() as Server)
      .get(`/probe/${route}`)
      .set('x-role', role)
      .expect(status);
  });
});
