import { applyDecorators, HttpCode, SerializeOptions } from '@nestjs/common';
import { ApiResponse } from '@nestjs/swagger';
import type { z } from 'zod';

/** Status and body of a route: enforced when it answers and written into the API document. */
export const Responds = (status: number, schema?: z.ZodType) =>
  applyDecorators(
    HttpCode(status),
    ...(schema
      ? [SerializeOptions({ schema }), ApiResponse({ status, standardSchema: schema })]
      : [ApiResponse({ status })]),
  );
