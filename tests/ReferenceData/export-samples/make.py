# writes the export samples and, independently of HemoRheo, what they hold in SI (literals times the definitions of the units)
import csv, math, os
D=os.path.dirname(os.path.abspath(__file__))
speeds=[(128.02,'down'),(42.673,'down'),(4.2673,'down'),(0.4267,'down'),(4.2673,'up'),(42.673,'up')]
torques=[9.8412,3.9027,0.6410,0.1204,0.6555,3.9121]
temps=[37.02,37.01,37.00,36.98,36.99,37.01]
def de(x,n): return f'{x:.{n}f}'.replace('.',',')
exp=[]
head='sample;loading;instrument;geometry;fluid;started at;ramp;temperature [°C];time [s];speed asked [rpm];speed [rpm];torque [µN.m]'
rows=[head]
for i,((n,r),t,T) in enumerate(zip(speeds,torques,temps)):
    rows.append(f'K-01;1;R1;CYL-1;;2026-03-02 09:15:00 +01:00;{r};{de(T,2)};{12*(i+1)};{de(n,4)};{de(n*1.0002,4)};{de(t,4)}')
    exp.append(['rows.csv','K-01',1,i+1,r,i+2,float(f'{n*1.0002:.4f}')*2*math.pi/60,t*1e-6,'','',T,12*(i+1)])
open(D+'/rows.csv','wb').write(('\r\n'.join(rows)+'\r\n').encode('windows-1252'))
rates=[300,100,10,1]; stress={1:[1312.4,520.13,93.07,22.915],2:[1330.9,527.6,95.2,23.480]}
lines=[]
ln=0
for l in (1,2):
    blk=['Sample: K-02','Person: P-02','Visit: 1',f'Loading: {l}','Instrument: R1',f'Start: 2026-03-03T1{l}:05:30+01:00','Readings: 4','Ramp,Temperature [°C],Rate asked [1/s],Rate [1/s],Stress [mPa]']
    start=len(lines)
    for i,(g,s) in enumerate(zip(rates,stress[l])):
        blk.append(f'down,37.0{i},{g},{g*1.001:.3f},{s}')
        exp.append(['blocks.txt','K-02',l,i+1,'down',start+len(blk),'','',float(f'{g*1.001:.3f}'),s/1000,37+i/100,''])
    lines+=blk+['']
open(D+'/blocks.txt','w',encoding='utf-8',newline='').write('\n'.join(lines))
w=csv.writer(open(D+'/expected.csv','w',newline=''),lineterminator='\n')
w.writerow('file,sample,loading,point,ramp,line,speed_rad_per_s,torque_N_m,rate_per_s,stress_Pa,temperature_C,elapsed_s'.split(','))
for e in exp: w.writerow([repr(x) if isinstance(x,float) else x for x in e])
