import { Column, Entity, PrimaryGeneratedColumn } from 'typeorm';
import type { Role } from '../../shared/access/roles.ts';

@Entity('user')
export class User {
  @PrimaryGeneratedColumn({ type: 'int', unsigned: true })
  id!: number;

  /** Lower case; the column is unique. */
  @Column({ type: 'varchar', length: 254, unique: true })
  email!: string;

  @Column({ type: 'varchar', length: 120 })
  name!: string;

  @Column({ type: 'simple-array' })
  roles!: Role[];

  @Column({ type: 'enum', enum: ['active', 'disabled'] })
  status!: 'active' | 'disabled';

  @Column({ name: 'password_hash', type: 'varchar', length: 100 })
  passwordHash!: string;

  @Column({ type: 'int', unsigned: true })
  version!: number;

  @Column({ name: 'created_at', type: 'datetime', precision: 6 })
  createdAt!: Date;
}
