// The measure of things: a Nest application with one route that reads one row by its key, and nothing else.
import 'reflect-metadata';

import { Controller, Get, Module, Param } from '@nestjs/common';
import { NestFactory } from '@nestjs/core';
import pg from 'pg';

const pool = new pg.Pool({ connectionString: process.env.DATABASE_URL, max: 10 });

class RowController {
  async one(id) {
    const { rows } = await pool.query('SELECT * FROM listings WHERE id = $1', [id]);
    return rows[0];
  }
}
Param('id')(RowController.prototype, 'one', 0);
Get(':id')(RowController.prototype, 'one', Object.getOwnPropertyDescriptor(RowController.prototype, 'one'));
Controller('listings')(RowController);

class BareModule {}
Module({ controllers: [RowController] })(BareModule);

const app = await NestFactory.create(BareModule, { logger: false });
await app.listen(Number(process.env.PORT), '127.0.0.1');
