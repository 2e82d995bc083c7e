/** The ferrule beside the name at the head of each mail: 80 x 36 pixels, shown at half size. */
export const markPng = Buffer.from(
  [
    'iVBORw0KGgoAAAANSUhEUgAAAFgAAAAoCAYAAAB6tz31AAACBklEQVR4nOzbvUrDUBQH8HPS+vEIziI4mYLWF9DJ0U',
    'WqbjbiQ/gCbo5qbbUuNuDkIIigL2AL2orgoqCDbjoKtTmetFUUU2xNTkDu+UFvA0ma8s/l5JLcWKBEJf3GzdrbgDjy',
    '28ZEVPaINhZ3areguoJ+42ZTF7yU6moPTpm3PUGizZdE/9FKrlIH1VHvAX9F9MRtgTxva3736gHUDxaEgTjEn1W0En',
    'elrH3oLo3NUPukqZZwPTgAVxCuz5hLNOp7c8XrJzBcuB4cABGHEWGtkey7Lzn2wb5jT4HBIu/BgYhu+Pc3B96s4mzx',
    '4gUM0uzBXDc9kIQ4ys36a8J7LGVTa2CQZsCIJBtwG5ePQT6d02CQJMSMQ067TorgjzL5y46jFNexK3yE8U7rLfDSc/',
    'laJWgdj4Jy/N+WITJUyeSr6cgvcuo7DViYBiws9hocVpj67YFV5v0hTtqDhWnAwjRgYRqwMA1YmAYsTAMWpgEL04CF',
    'acDCNGBh/+5exP+5H/xxTCVKAxamAQtrPbZ37DIvTkAM/AmE84XqJBii9dieMJaezOG+8ok8BYM0RxEoXSraE08GG+',
    'ZNPBEbpvFznTq3h/y9sVConoGhIg9YJ/99F03ABA0COvInZWd2asfY7MDKFy7ggAnYGVBf9R6wvkLQk3bAdM518/m3',
    'jT9fginoSzDd0un+wt4BAAD//5TsnbAAAAAGSURBVAMAkQvFzJuUr94AAAAASUVORK5CYII=',
  ].join(''),
  'base64',
);
