import { DomainError } from '../common/domain-error';

export class FeedstuffNotFound extends DomainError {
  constructor() {
    super({
      status: 404,
      code: 'feedstuff-not-found',
      title: 'There is no such feedstuff in the book or among your own',
    });
  }
}

export class BookFeedstuffFixed extends DomainError {
  constructor() {
    super({
      status: 409,
      code: 'book-feedstuff-fixed',
      title: 'Book feedstuffs are not edited: make a feedstuff of your own that rests on it',
    });
  }
}
