import { discardWorking, readDesk, readLastTime, saveWorking, signOffEntry, startEntry, takeBackEntry } from '#contracts/entries.ts';
import { done } from '#contracts/fields.ts';
import { handle, type EndpointTable } from '#server/http/endpoint-table.ts';
import { readDeskOf } from './desk.service.ts';
import { discardTyped } from './discard-working.service.ts';
import { readLastLines } from './last-time.service.ts';
import { saveTyped } from './save-working.service.ts';
import { signOffDay } from './sign-off.service.ts';
import { startDay } from './start-entry.service.ts';
import { takeBack } from './take-back.service.ts';

export function entryRoutes(table: EndpointTable): void {
  handle(table, startEntry, async ({ em, viewer, parts }, { params, body }) => ({
    number: await startDay(em, viewer, params.build, { day: body.day, stage: body.stage ?? null }, parts.now()),
  }));
  handle(table, readDesk, ({ em, viewer }, { params }) => readDeskOf(em, viewer, params.build, params.number));
  handle(table, saveWorking, ({ em, viewer, parts }, { params, body }) => saveTyped(em, viewer, params.build, params.number, body, parts.now()));
  handle(table, signOffEntry, ({ em, viewer, parts }, { params, body }) => signOffDay(em, viewer, params.build, params.number, body, parts.now()));
  handle(table, takeBackEntry, async ({ em, viewer, parts }, { params, body }) => ({
    version: await takeBack(em, viewer, params.build, params.number, body.version, parts.now()),
  }));
  handle(table, discardWorking, async ({ em, viewer }, { params, body }) => {
    await discardTyped(em, viewer, params.build, params.number, body.version);
    return done;
  });
  handle(table, readLastTime, ({ em, viewer }, { params, query }) => readLastLines(em, viewer, params.build, params.number, query.stage ?? null));
}
