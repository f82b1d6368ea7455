import type { RequestHandler } from 'express';

/** Answers of the API belong to the person who asked: nothing on the way keeps them. */
export const apiHeaders: RequestHandler = (_request, response, next) => {
  response.setHeader('Cache-Control', 'no-store');
  next();
};
