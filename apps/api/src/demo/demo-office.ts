import { Injectable } from '@nestjs/common';
import { InvitationsService } from '../auth/accounts/invitations.service';
import { LinksService } from '../auth/accounts/links.service';
import type { SignedIn } from '../auth/signed-in';
import { DistrictsService } from '../districts/districts.service';
import { OfficeService } from '../office/office.service';
import { RulesService } from '../rules/rules.service';
import { SensorsService } from '../towers/sensors.service';
import { SourcesService } from '../towers/sources.service';
import { TowersService } from '../towers/towers.service';
import type { DemoPerson, DemoScenario, DemoTower } from './demo-scenario';

/** The demo's staff as the services know them. */
export type DemoStaff = Readonly<Record<DemoPerson['key'], SignedIn>>;

/** Sets up the demo's office as its people would: accounts by invitation, towers, districts, rules put in force. */
@Injectable()
export class DemoOffice {
  constructor(
    private readonly invitations: InvitationsService,
    private readonly links: LinksService,
    private readonly office: OfficeService,
    private readonly towers: TowersService,
    private readonly sensors: SensorsService,
    private readonly sources: SourcesService,
    private readonly districts: DistrictsService,
    private readonly rules: RulesService,
  ) {}

  /** Makes everything and returns the staff. */
  async setUp(scenario: DemoScenario): Promise<DemoStaff> {
    const person = (key: DemoPerson['key']): DemoPerson => scenario.staff.find((each) => each.key === key)!;
    const { password } = scenario;
    const administrator = await this.invite(person('administrator'), 'service', [], password);
    await this.office.set(scenario.office, administrator);
    const analyst = await this.invite(person('analyst'), administrator, [], password);
    const deputy = await this.invite(person('deputy'), administrator, [], password);
    const towerIds = new Map<string, number>();
    for (const tower of scenario.towers) towerIds.set(tower.slug, await this.makeTower(tower, administrator));
    const districtIds = await this.makeDistricts(scenario, towerIds, administrator, analyst);
    const officer = (key: DemoPerson['key']): Promise<SignedIn> => {
      const own = (person(key).districts ?? []).map((name) => districtIds.get(name)!);
      return this.invite(person(key), administrator, own, password);
    };
    const [floorOfficer, benchOfficer] = [await officer('floorOfficer'), await officer('benchOfficer')];
    return { administrator, analyst, deputy, floorOfficer, benchOfficer };
  }

  private async invite(
    { email, name, role }: DemoPerson,
    by: SignedIn | 'service',
    districtIds: number[],
    password: string,
  ): Promise<SignedIn> {
    const { user, invitationUrl } = await this.invitations.invite({ email, name, role, districtIds }, by);
    await this.links.acceptLink({ token: invitationUrl.split('/').at(-1) ?? '', password });
    return { id: user.id, name, email, role, districtIds };
  }

  private async makeTower({ sensors, ...tower }: DemoTower, by: SignedIn): Promise<number> {
    const { id } = await this.towers.create(tower, by);
    for (const sensor of sensors) await this.sensors.add(id, sensor, by);
    await this.sources.add(id, { kind: 'folder', path: tower.slug, mapping: { timeColumn: 'time' } }, by);
    return id;
  }

  private async makeDistricts(
    { districts, rules, ruleNote }: DemoScenario,
    towerIds: ReadonlyMap<string, number>,
    administrator: SignedIn,
    analyst: SignedIn,
  ): Promise<Map<string, number>> {
    const idOf = (slug: string): number => towerIds.get(slug)!;
    const made = new Map<string, number>();
    for (const { towers, floorTower, benchTower, pm25Tower, ...district } of districts) {
      const input = {
        ...district,
        towers: towers.map(({ slug, mayBegin, mayEnd }) => ({ towerId: idOf(slug), mayBegin, mayEnd })),
        ...{ floorTowerId: idOf(floorTower), benchTowerId: idOf(benchTower) },
        pm25TowerId: pm25Tower === null ? null : idOf(pm25Tower),
      };
      const { id } = await this.districts.create(input, administrator);
      const draft = await this.rules.draft(id, { body: rules[district.slug]!, note: ruleNote }, analyst);
      await this.rules.putInForce(draft.id, analyst);
      made.set(district.name, id);
    }
    return made;
  }
}
