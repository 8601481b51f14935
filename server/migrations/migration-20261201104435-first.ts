import { Migration } from '@mikro-orm/migrations';

export class Migration20261201104435_first extends Migration {

  override async up(): Promise<void> {
    this.addSql(`create table \`job\` (\`id\` integer not null primary key autoincrement, \`kind\` text not null, \`payload\` json not null, \`run_at\` datetime not null, \`attempts\` integer not null default 0, \`claimed_at\` datetime null, \`done_at\` datetime null, \`given_up_at\` datetime null, \`failure\` text null, \`created_at\` datetime not null);`);
    this.addSql(`create index \`job_done_at_run_at_index\` on \`job\` (\`done_at\`, \`run_at\`);`);

    this.addSql(`create table \`person\` (\`id\` integer not null primary key autoincrement, \`handle\` text not null, \`name\` text not null, \`about\` text not null default '', \`email\` text not null, \`email_confirmed_at\` datetime null, \`password_hash\` text null, \`github_id\` text null, \`role\` text not null default 'member', \`suspended_until\` datetime null, \`suspended_reason\` text null, \`sequence\` integer not null default 0, \`created_at\` datetime not null);`);
    this.addSql(`create unique index \`person_handle_unique\` on \`person\` (\`handle\`);`);
    this.addSql(`create unique index \`person_email_unique\` on \`person\` (\`email\`);`);
    this.addSql(`create unique index \`person_github_id_unique\` on \`person\` (\`github_id\`);`);

    this.addSql(`create table \`http_session\` (\`sid\` text not null, \`data\` text not null, \`person_id\` integer null, \`expires_at\` datetime not null, \`created_at\` datetime not null, constraint \`http_session_person_id_foreign\` foreign key(\`person_id\`) references \`person\`(\`id\`) on delete cascade on update cascade, primary key (\`sid\`));`);
    this.addSql(`create index \`http_session_person_id_index\` on \`http_session\` (\`person_id\`);`);
    this.addSql(`create index \`http_session_expires_at_index\` on \`http_session\` (\`expires_at\`);`);

    this.addSql(`create table \`build\` (\`id\` integer not null primary key autoincrement, \`slug\` text not null, \`owner_id\` integer not null, \`kind\` text not null, \`title\` text not null, \`lead\` text not null default '', \`maker\` text not null default '', \`model\` text not null default '', \`year\` integer null, \`year_about\` integer not null default false, \`frame_number\` text not null default '', \`engine_number\` text not null default '', \`hull_number\` text not null default '', \`serial_number\` text not null default '', \`registration\` text not null default '', \`numbers_shown\` integer not null default false, \`stands\` text not null default 'working', \`stands_note\` text not null default '', \`currency\` text not null, \`measures\` text not null, \`visibility\` text not null default 'public', \`costs_shown\` integer not null default true, \`archived_at\` datetime null, \`before_picture_id\` integer null, \`after_picture_id\` integer null, \`last_number\` integer not null default 0, \`started_on\` text not null, \`version\` integer not null default 1, \`created_at\` datetime not null, constraint \`build_owner_id_foreign\` foreign key(\`owner_id\`) references \`person\`(\`id\`) on update cascade, constraint \`build_before_picture_id_foreign\` foreign key(\`before_picture_id\`) references \`picture\`(\`id\`) on delete set null on update cascade, constraint \`build_after_picture_id_foreign\` foreign key(\`after_picture_id\`) references \`picture\`(\`id\`) on delete set null on update cascade);`);
    this.addSql(`create unique index \`build_slug_unique\` on \`build\` (\`slug\`);`);
    this.addSql(`create index \`build_owner_id_index\` on \`build\` (\`owner_id\`);`);
    this.addSql(`create index \`build_before_picture_id_index\` on \`build\` (\`before_picture_id\`);`);
    this.addSql(`create index \`build_after_picture_id_index\` on \`build\` (\`after_picture_id\`);`);

    this.addSql(`create table \`picture\` (\`id\` integer not null primary key autoincrement, \`key\` text not null, \`build_id\` integer not null, \`uploader_id\` integer not null, \`state\` text not null default 'working', \`problem\` text null, \`original_name\` text not null, \`bytes\` integer not null default 0, \`width\` integer not null default 0, \`height\` integer not null default 0, \`taken_at\` datetime null, \`placeholder\` text not null default '', \`widths\` json not null, \`created_at\` datetime not null, constraint \`picture_build_id_foreign\` foreign key(\`build_id\`) references \`build\`(\`id\`) on delete cascade on update cascade, constraint \`picture_uploader_id_foreign\` foreign key(\`uploader_id\`) references \`person\`(\`id\`) on update cascade);`);
    this.addSql(`create unique index \`picture_key_unique\` on \`picture\` (\`key\`);`);
    this.addSql(`create index \`picture_build_id_index\` on \`picture\` (\`build_id\`);`);
    this.addSql(`create index \`picture_uploader_id_index\` on \`picture\` (\`uploader_id\`);`);

    this.addSql(`create table \`material\` (\`id\` integer not null primary key autoincrement, \`owner_id\` integer not null, \`added_for_id\` integer null, \`name\` text not null, \`name_key\` text not null, \`dimension\` text not null, \`unit\` text not null, \`ratio\` json null, \`packs\` json not null, \`hazards\` json not null, \`created_at\` datetime not null, constraint \`material_owner_id_foreign\` foreign key(\`owner_id\`) references \`person\`(\`id\`) on delete cascade on update cascade, constraint \`material_added_for_id_foreign\` foreign key(\`added_for_id\`) references \`build\`(\`id\`) on delete set null on update cascade);`);
    this.addSql(`create index \`material_owner_id_index\` on \`material\` (\`owner_id\`);`);
    this.addSql(`create index \`material_added_for_id_index\` on \`material\` (\`added_for_id\`);`);
    this.addSql(`create unique index \`material_owner_id_name_key_unique\` on \`material\` (\`owner_id\`, \`name_key\`);`);

    this.addSql(`create table \`crew_member\` (\`id\` integer not null primary key autoincrement, \`build_id\` integer not null, \`person_id\` integer not null, \`created_at\` datetime not null, constraint \`crew_member_build_id_foreign\` foreign key(\`build_id\`) references \`build\`(\`id\`) on delete cascade on update cascade, constraint \`crew_member_person_id_foreign\` foreign key(\`person_id\`) references \`person\`(\`id\`) on delete cascade on update cascade);`);
    this.addSql(`create index \`crew_member_build_id_index\` on \`crew_member\` (\`build_id\`);`);
    this.addSql(`create index \`crew_member_person_id_index\` on \`crew_member\` (\`person_id\`);`);
    this.addSql(`create unique index \`crew_member_build_id_person_id_unique\` on \`crew_member\` (\`build_id\`, \`person_id\`);`);

    this.addSql(`create table \`build_address\` (\`slug\` text not null, \`build_id\` integer not null, constraint \`build_address_build_id_foreign\` foreign key(\`build_id\`) references \`build\`(\`id\`) on delete cascade on update cascade, primary key (\`slug\`));`);
    this.addSql(`create index \`build_address_build_id_index\` on \`build_address\` (\`build_id\`);`);

    this.addSql(`create table \`shelf\` (\`id\` integer not null primary key autoincrement, \`build_id\` integer null, \`person_id\` integer null, \`currency\` text not null, \`method\` text not null default 'fifo', constraint \`shelf_build_id_foreign\` foreign key(\`build_id\`) references \`build\`(\`id\`) on delete cascade on update cascade, constraint \`shelf_person_id_foreign\` foreign key(\`person_id\`) references \`person\`(\`id\`) on delete cascade on update cascade, constraint shelf_check check ((build_id is null) <> (person_id is null)));`);
    this.addSql(`create index \`shelf_build_id_index\` on \`shelf\` (\`build_id\`);`);
    this.addSql(`create unique index \`shelf_build_id_unique\` on \`shelf\` (\`build_id\`);`);
    this.addSql(`create index \`shelf_person_id_index\` on \`shelf\` (\`person_id\`);`);
    this.addSql(`create unique index \`shelf_person_id_currency_unique\` on \`shelf\` (\`person_id\`, \`currency\`);`);

    this.addSql(`create table \`work_kind\` (\`id\` integer not null primary key autoincrement, \`one\` text not null, \`many\` text not null, \`created_at\` datetime not null);`);
    this.addSql(`create unique index \`work_kind_one_unique\` on \`work_kind\` (\`one\`);`);

    this.addSql(`create table \`stage\` (\`id\` integer not null primary key autoincrement, \`build_id\` integer not null, \`title\` text not null, \`position\` integer not null, \`planned_money\` integer null, \`planned_minutes\` integer null, \`planned_work\` text null, \`work_unit\` text null, \`work_kind_id\` integer null, \`done\` integer not null default false, constraint \`stage_build_id_foreign\` foreign key(\`build_id\`) references \`build\`(\`id\`) on delete cascade on update cascade, constraint \`stage_work_kind_id_foreign\` foreign key(\`work_kind_id\`) references \`work_kind\`(\`id\`) on delete set null on update cascade);`);
    this.addSql(`create index \`stage_build_id_index\` on \`stage\` (\`build_id\`);`);
    this.addSql(`create index \`stage_work_kind_id_index\` on \`stage\` (\`work_kind_id\`);`);

    this.addSql(`create table \`entry\` (\`id\` integer not null primary key autoincrement, \`guid\` text not null, \`build_id\` integer not null, \`author_id\` integer not null, \`sequence\` integer not null, \`number\` integer not null, \`slug\` text null, \`working_at\` datetime null, \`title\` text not null default '', \`day\` text not null, \`day_to\` text null, \`stage_id\` integer null, \`work_amount\` text null, \`work_unit\` text null, \`work_kind_id\` integer null, \`first_published_at\` datetime null, \`edited_at\` datetime null, \`version\` integer not null default 1, \`created_at\` datetime not null, \`taken_back\` text null, \`working\` json null, \`published\` json null, constraint \`entry_build_id_foreign\` foreign key(\`build_id\`) references \`build\`(\`id\`) on delete cascade on update cascade, constraint \`entry_author_id_foreign\` foreign key(\`author_id\`) references \`person\`(\`id\`) on update cascade, constraint \`entry_stage_id_foreign\` foreign key(\`stage_id\`) references \`stage\`(\`id\`) on delete set null on update cascade, constraint \`entry_work_kind_id_foreign\` foreign key(\`work_kind_id\`) references \`work_kind\`(\`id\`) on delete set null on update cascade);`);
    this.addSql(`create unique index \`entry_guid_unique\` on \`entry\` (\`guid\`);`);
    this.addSql(`create index \`entry_build_id_index\` on \`entry\` (\`build_id\`);`);
    this.addSql(`create index \`entry_author_id_index\` on \`entry\` (\`author_id\`);`);
    this.addSql(`create index \`entry_stage_id_index\` on \`entry\` (\`stage_id\`);`);
    this.addSql(`create index \`entry_work_kind_id_index\` on \`entry\` (\`work_kind_id\`);`);
    this.addSql(`create index \`entry_build_id_day_index\` on \`entry\` (\`build_id\`, \`day\`);`);
    this.addSql(`create index \`entry_first_published_at_index\` on \`entry\` (\`first_published_at\`);`);
    this.addSql(`create unique index \`entry_build_id_number_unique\` on \`entry\` (\`build_id\`, \`number\`);`);
    this.addSql(`create unique index \`entry_build_id_slug_unique\` on \`entry\` (\`build_id\`, \`slug\`);`);

    this.addSql(`create table \`time_line\` (\`id\` integer not null primary key autoincrement, \`build_id\` integer not null, \`entry_id\` integer not null, \`block\` text not null, \`line\` text not null, \`day\` text not null, \`stage_id\` integer null, \`person_id\` integer null, \`name\` text not null, \`minutes\` integer not null, \`what\` text not null, \`kind\` text not null, constraint \`time_line_build_id_foreign\` foreign key(\`build_id\`) references \`build\`(\`id\`) on delete cascade on update cascade, constraint \`time_line_entry_id_foreign\` foreign key(\`entry_id\`) references \`entry\`(\`id\`) on delete cascade on update cascade, constraint \`time_line_stage_id_foreign\` foreign key(\`stage_id\`) references \`stage\`(\`id\`) on delete set null on update cascade, constraint \`time_line_person_id_foreign\` foreign key(\`person_id\`) references \`person\`(\`id\`) on delete set null on update cascade);`);
    this.addSql(`create index \`time_line_build_id_index\` on \`time_line\` (\`build_id\`);`);
    this.addSql(`create index \`time_line_entry_id_index\` on \`time_line\` (\`entry_id\`);`);
    this.addSql(`create index \`time_line_stage_id_index\` on \`time_line\` (\`stage_id\`);`);
    this.addSql(`create index \`time_line_person_id_index\` on \`time_line\` (\`person_id\`);`);

    this.addSql(`create table \`receipt\` (\`id\` integer not null primary key autoincrement, \`build_id\` integer not null, \`entry_id\` integer null, \`block\` text null, \`sequence\` integer not null, \`day\` text not null, \`supplier\` text not null, \`currency\` text not null, \`rate\` text not null, \`basis\` text not null, \`discount\` integer not null, \`delivery\` integer not null, \`tax\` integer not null, \`paper_total\` integer null, \`total\` integer not null, \`not_sorted\` integer not null, \`created_at\` datetime not null, constraint \`receipt_build_id_foreign\` foreign key(\`build_id\`) references \`build\`(\`id\`) on delete cascade on update cascade, constraint \`receipt_entry_id_foreign\` foreign key(\`entry_id\`) references \`entry\`(\`id\`) on delete cascade on update cascade);`);
    this.addSql(`create index \`receipt_build_id_index\` on \`receipt\` (\`build_id\`);`);
    this.addSql(`create index \`receipt_entry_id_index\` on \`receipt\` (\`entry_id\`);`);
    this.addSql(`create unique index \`receipt_entry_id_block_unique\` on \`receipt\` (\`entry_id\`, \`block\`);`);

    this.addSql(`create table \`receipt_line\` (\`id\` integer not null primary key autoincrement, \`receipt_id\` integer not null, \`line\` text not null, \`position\` integer not null, \`label\` text not null, \`material_id\` integer null, \`typed\` text not null, \`amount\` text null, \`own\` integer not null, \`door\` integer not null, \`goes\` text not null, \`arrived_on\` text null, constraint \`receipt_line_receipt_id_foreign\` foreign key(\`receipt_id\`) references \`receipt\`(\`id\`) on delete cascade on update cascade, constraint \`receipt_line_material_id_foreign\` foreign key(\`material_id\`) references \`material\`(\`id\`) on delete set null on update cascade);`);
    this.addSql(`create index \`receipt_line_receipt_id_index\` on \`receipt_line\` (\`receipt_id\`);`);
    this.addSql(`create index \`receipt_line_material_id_index\` on \`receipt_line\` (\`material_id\`);`);
    this.addSql(`create unique index \`receipt_line_receipt_id_line_unique\` on \`receipt_line\` (\`receipt_id\`, \`line\`);`);

    this.addSql(`create table \`published_picture\` (\`id\` integer not null primary key autoincrement, \`entry_id\` integer not null, \`picture_id\` integer not null, \`position\` integer not null, \`cover\` integer not null, \`alt\` text not null, constraint \`published_picture_entry_id_foreign\` foreign key(\`entry_id\`) references \`entry\`(\`id\`) on delete cascade on update cascade, constraint \`published_picture_picture_id_foreign\` foreign key(\`picture_id\`) references \`picture\`(\`id\`) on delete cascade on update cascade);`);
    this.addSql(`create index \`published_picture_entry_id_index\` on \`published_picture\` (\`entry_id\`);`);
    this.addSql(`create index \`published_picture_picture_id_index\` on \`published_picture\` (\`picture_id\`);`);
    this.addSql(`create unique index \`published_picture_entry_id_picture_id_unique\` on \`published_picture\` (\`entry_id\`, \`picture_id\`);`);

    this.addSql(`create table \`movement\` (\`id\` integer not null primary key autoincrement, \`shelf_id\` integer not null, \`build_id\` integer null, \`key\` text not null, \`kind\` text not null, \`material_id\` integer not null, \`entry_id\` integer null, \`receipt_line_id\` integer null, \`block\` text null, \`line\` text null, \`day\` text not null, \`sequence\` integer not null, \`place\` integer not null, \`typed\` text not null, \`amount\` text not null, \`cost\` integer null, \`of\` text null, \`shortage\` text null, \`value\` integer not null, \`short\` text not null, \`counts\` text null, \`stage_id\` integer null, constraint \`movement_shelf_id_foreign\` foreign key(\`shelf_id\`) references \`shelf\`(\`id\`) on delete cascade on update cascade, constraint \`movement_build_id_foreign\` foreign key(\`build_id\`) references \`build\`(\`id\`) on delete cascade on update cascade, constraint \`movement_material_id_foreign\` foreign key(\`material_id\`) references \`material\`(\`id\`) on update cascade, constraint \`movement_entry_id_foreign\` foreign key(\`entry_id\`) references \`entry\`(\`id\`) on delete cascade on update cascade, constraint \`movement_receipt_line_id_foreign\` foreign key(\`receipt_line_id\`) references \`receipt_line\`(\`id\`) on delete cascade on update cascade, constraint \`movement_stage_id_foreign\` foreign key(\`stage_id\`) references \`stage\`(\`id\`) on delete set null on update cascade);`);
    this.addSql(`create index \`movement_shelf_id_index\` on \`movement\` (\`shelf_id\`);`);
    this.addSql(`create index \`movement_build_id_index\` on \`movement\` (\`build_id\`);`);
    this.addSql(`create index \`movement_material_id_index\` on \`movement\` (\`material_id\`);`);
    this.addSql(`create index \`movement_entry_id_index\` on \`movement\` (\`entry_id\`);`);
    this.addSql(`create index \`movement_receipt_line_id_index\` on \`movement\` (\`receipt_line_id\`);`);
    this.addSql(`create index \`movement_stage_id_index\` on \`movement\` (\`stage_id\`);`);
    this.addSql(`create index \`movement_shelf_id_material_id_day_index\` on \`movement\` (\`shelf_id\`, \`material_id\`, \`day\`);`);
    this.addSql(`create index \`movement_build_id_kind_index\` on \`movement\` (\`build_id\`, \`kind\`);`);
    this.addSql(`create unique index \`movement_shelf_id_key_unique\` on \`movement\` (\`shelf_id\`, \`key\`);`);

    this.addSql(`create table \`entry_address\` (\`id\` integer not null primary key autoincrement, \`build_id\` integer not null, \`slug\` text not null, \`entry_id\` integer null, constraint \`entry_address_build_id_foreign\` foreign key(\`build_id\`) references \`build\`(\`id\`) on delete cascade on update cascade, constraint \`entry_address_entry_id_foreign\` foreign key(\`entry_id\`) references \`entry\`(\`id\`) on delete set null on update cascade);`);
    this.addSql(`create index \`entry_address_build_id_index\` on \`entry_address\` (\`build_id\`);`);
    this.addSql(`create index \`entry_address_entry_id_index\` on \`entry_address\` (\`entry_id\`);`);
    this.addSql(`create unique index \`entry_address_build_id_slug_unique\` on \`entry_address\` (\`build_id\`, \`slug\`);`);

    this.addSql(`create table \`cost\` (\`id\` integer not null primary key autoincrement, \`build_id\` integer not null, \`entry_id\` integer null, \`receipt_line_id\` integer null, \`block\` text null, \`line\` text null, \`day\` text not null, \`sequence\` integer not null, \`stage_id\` integer null, \`category\` text not null, \`label\` text not null, \`money\` integer not null, constraint \`cost_build_id_foreign\` foreign key(\`build_id\`) references \`build\`(\`id\`) on delete cascade on update cascade, constraint \`cost_entry_id_foreign\` foreign key(\`entry_id\`) references \`entry\`(\`id\`) on delete cascade on update cascade, constraint \`cost_receipt_line_id_foreign\` foreign key(\`receipt_line_id\`) references \`receipt_line\`(\`id\`) on delete cascade on update cascade, constraint \`cost_stage_id_foreign\` foreign key(\`stage_id\`) references \`stage\`(\`id\`) on delete set null on update cascade);`);
    this.addSql(`create index \`cost_build_id_index\` on \`cost\` (\`build_id\`);`);
    this.addSql(`create index \`cost_entry_id_index\` on \`cost\` (\`entry_id\`);`);
    this.addSql(`create index \`cost_receipt_line_id_index\` on \`cost\` (\`receipt_line_id\`);`);
    this.addSql(`create index \`cost_stage_id_index\` on \`cost\` (\`stage_id\`);`);
  }

}
