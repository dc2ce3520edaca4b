export class HealthDto {
  status: 'ok';
}
