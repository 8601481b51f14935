import { Build } from './build.ts';
import { BuildAddress } from './build-address.ts';
import { Cost } from './cost.ts';
import { CrewMember } from './crew-member.ts';
import { Entry } from './entry.ts';
import { EntryAddress } from './entry-address.ts';
import { HttpSession } from './http-session.ts';
import { Job } from './job.ts';
import { Material } from './material.ts';
import { Movement } from './movement.ts';
import { Person } from './person.ts';
import { Picture } from './picture.ts';
import { PublishedPicture } from './published-picture.ts';
import { Receipt } from './receipt.ts';
import { ReceiptLine } from './receipt-line.ts';
import { Shelf } from './shelf.ts';
import { Stage } from './stage.ts';
import { TimeLine } from './time-line.ts';
import { WorkKind } from './work-kind.ts';

export const entities = [
  Person, HttpSession, Build, BuildAddress, CrewMember, WorkKind, Stage, Shelf, Material, Entry, EntryAddress,
  Receipt, ReceiptLine, Movement, Cost, TimeLine, Picture, PublishedPicture, Job,
];

export {
  Build, BuildAddress, Cost, CrewMember, Entry, EntryAddress, HttpSession, Job, Material, Movement, Person, Picture,
  PublishedPicture, Receipt, ReceiptLine, Shelf, Stage, TimeLine, WorkKind,
};
