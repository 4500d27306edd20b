export interface Message {
  subject: string;
  body: string;
}
