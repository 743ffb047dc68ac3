"""Equilibrium as the minimum of the Gibbs energy of all amounts at fixed T and p, by a general-purpose optimiser (SLSQP) from
five starts; amounts of elements are held by linear constraints. Run as: python3 gibbs_minimisation.py FOLDER, where FOLDER holds
the NIST-JANAF tables as CSV (species, then _g or _l where there are two phases)."""
import numpy as np, scipy, sys
from scipy.optimize import minimize
R=8.31446261815324
def table(name):
    rows=[l.strip().split(',') for l in open('%s/%s.csv'%(sys.argv[1],name))][1:]
    T=[float(r[0]) for r in rows]; h0=[float(r[4]) for r in rows if float(r[0])==298.15][0]
    d={float(r[0]):(float(r[3])+h0)*1e3-float(r[0])*float(r[2]) for r in rows}
    return d
def run(label,species,coef,start,T,p,inert,pure):
    mu0=np.array([table(f)[T] for f in species]); n0=np.array(start,float); nu=np.array(coef,float)
    gas=np.array([s not in pure for s in species])
    # element conservation for one reaction equals n = n0 + nu xi; minimise over all amounts with A n = A n0,
    # A = a basis of the null space of nu
    u,s,vt=np.linalg.svd(nu[None,:]); A=vt[1:]
    def G(n):
        n=np.maximum(n,1e-300); ng=n[gas].sum()+inert
        a=np.where(gas,np.log(n*p/ng),0.0)
        g=(n*(mu0/(R*T)+a)).sum()
        if inert>0: g+=inert*np.log(inert*p/ng)
        return g
    best=None
    lo=max(-n0[i]/nu[i] for i in range(len(nu)) if nu[i]>0); hi=min(-n0[i]/nu[i] for i in range(len(nu)) if nu[i]<0)
    for f in (0.1,0.3,0.5,0.7,0.9):
        x0=n0+nu*(lo+f*(hi-lo))
        g0=G(x0)
        r=minimize(lambda n:G(n)-g0,x0,method='SLSQP',constraints=[{'type':'eq','fun':lambda n:A@(n-n0)}],bounds=[(1e-14,None)]*len(nu),options={'ftol':1e-15,'maxiter':2000})
        if best is None or r.fun+g0<best[0]: best=(r.fun+g0,r.x)
    n=best[1]; xi=(n-n0)@nu/(nu@nu)
    print("%s,%g,%g,%s,%g,%.7f"%(label,T,p,';'.join('%g'%v for v in start),inert,xi))
print("# reaction,T_K,p_bar,start_mol,inert_mol,extent_mol")
print("# scipy",scipy.__version__,"numpy",np.__version__)
run("N2(g) + 3 H2(g) = 2 NH3(g)",["N2","H2","NH3"],[-1,-3,2],[1,3,0],700.,100.,0,())
run("N2(g) + 3 H2(g) = 2 NH3(g)",["N2","H2","NH3"],[-1,-3,2],[1,3,0],600.,10.,0.4,())
run("N2(g) + 3 H2(g) = 2 NH3(g)",["N2","H2","NH3"],[-1,-3,2],[2,2,0.5],800.,300.,0,())
run("N2O4(g) = 2 NO2(g)",["N2O4","NO2"],[-1,2],[1,0],300.,1.,0,())
run("N2O4(g) = 2 NO2(g)",["N2O4","NO2"],[-1,2],[1,0],400.,5.,1,())
run("CO(g) + H2O(g) = CO2(g) + H2(g)",["CO","H2O_g","CO2","H2"],[-1,-1,1,1],[1,2,0,0],900.,1.,0,())
run("CO(g) + H2O(g) = CO2(g) + H2(g)",["CO","H2O_g","CO2","H2"],[-1,-1,1,1],[1,1,0.3,0.2],1200.,20.,0.5,())
run("N2(g) + O2(g) = 2 NO(g)",["N2","O2","NO"],[-1,-1,2],[3.76,1,0],2000.,1.,0,())
run("2 NO(g) + O2(g) = 2 NO2(g)",["NO","O2","NO2"],[-2,-1,2],[2,1,0],700.,1.,3.76,())
run("Ca(OH)2(s) = CaO(s) + H2O(g)",["CaOH2","CaO","H2O_g"],[-1,1,1],[1,0,0],700.,1.,1.0,("CaOH2","CaO"))
