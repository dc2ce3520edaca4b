/** A DTO's fields without its class, as rows and literals have them. */
export type Plain<Dto> = { [Field in keyof Dto]: Dto[Field] };
