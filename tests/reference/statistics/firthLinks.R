# Penalised fits (l + 0.5 log det I, I the expected information) with probit and complementary
# log-log links, and their profile limits of x50 and x01, by base R alone (no package of a fitter).
# Run: Rscript firthLinks.R > firthLinks.json   (R 4.2.2)
x <- c(1.6907,1.7242,1.7552,1.7842,1.8113,1.8369,1.8610,1.8839)
n <- c(59,60,62,56,63,59,62,60); k <- c(6,13,18,28,52,53,61,60)
xc <- x - 1.8
pen <- function(a, b, link) {
  eta <- a + b * xc
  if (link == "probit") { lp <- pnorm(eta, log.p = TRUE); lq <- pnorm(-eta, log.p = TRUE); d <- dnorm(eta) }
  else { lq <- -exp(eta); lp <- log(-expm1(lq)); d <- exp(eta + lq) }
  w <- n * d^2 / exp(lp + lq)
  w[!is.finite(w)] <- 0
  A <- matrix(c(sum(w), sum(w * xc), sum(w * xc), sum(w * xc^2)), 2)
  c(sum(k * lp + (n - k) * ifelse(n == k, 0, lq)) , 0.5 * log(det(A)))
}
q <- function(p, link) if (link == "probit") qnorm(p) else log(-log1p(-p))
best <- function(f, lo, hi) { o <- optimize(f, c(lo, hi), maximum = TRUE, tol = 1e-12); o }
num <- function(v) format(v, digits = 15)
out <- c()
for (link in c("probit", "cloglog")) {
  f <- function(th) -sum(pen(th[1], th[2], link))
  th <- c(0, 20)
  for (i in 1:6) th <- optim(th, f, method = "BFGS", control = list(reltol = 1e-16, maxit = 1000))$par
  for (i in 1:4) th <- optim(th, f, method = "Nelder-Mead", control = list(reltol = 1e-16, maxit = 5000))$par
  m <- -f(th)
  ends <- c()
  for (p in c(0.5, 0.01)) {
    prof <- function(z) best(function(b) sum(pen(q(p, link) - b * z, b, link)), 2, 80)$objective
    z0 <- (q(p, link) - th[1]) / th[2]
    g <- function(z) 2 * (m - prof(z)) - 3.8414588206941236
    ends <- c(ends, uniroot(g, c(z0 - 0.12, z0), tol = 1e-13)$root + 1.8, uniroot(g, c(z0, z0 + 0.1), tol = 1e-13)$root + 1.8)
  }
  out <- c(out, sprintf('  "%s": { "slope": %s, "x50": %s, "penalisedLogLik": %s, "x50Ends": [%s, %s], "x01Ends": [%s, %s] }',
    link, num(th[2]), num((q(0.5, link) - th[1]) / th[2] + 1.8), num(m), num(ends[1]), num(ends[2]), num(ends[3]), num(ends[4])))
}
cat("{\n", paste(out, collapse = ",\n"), "\n}\n", sep = "")
